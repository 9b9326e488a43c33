package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.moves.BenchString;

/** A job sheet has a row for each pass; as a bench sheet the last one that was read counts. */
class JobSheetReadBackTest {
  private static final String H =
      "ticket,instrument,serial,string,pitch,scale_mm,gauge_in,construction,pass,verdict,f12\n";

  @TempDir Path folder;

  @Test
  void takesTheLastPassOfEachString() throws IOException {
    String sheet =
        H
            + "7,Demo,S1,1,E4,648,0.010,plain-steel,1,move,5.0\n"
            + "7,Demo,S1,2,B3,648,0.013,plain-steel,1,leave,0.3\n"
            + "7,Demo,S1,1,E4,648,0.010,plain-steel,2,leave,0.2\n"
            + "7,Demo,S1,2,B3,648,0.013,plain-steel,2,,\n";

    List<BenchString> strings = Sheets.read(folder, sheet);

    assertThat(strings)
        .extracting(s -> s.string().number() + ":" + s.readings().frets().get(12).written())
        .containsExactly("2:0.3", "1:0.2");
  }

  @Test
  void keepsAStringThatWasNeverRead() throws IOException {
    String sheet =
        H
            + "7,Demo,S1,1,E4,648,0.010,plain-steel,1,move,5.0\n"
            + "7,Demo,S1,2,B3,648,0.013,plain-steel,1,,\n"
            + "7,Demo,S1,2,B3,648,0.013,plain-steel,2,,\n";

    assertThat(Sheets.read(folder, sheet)).hasSize(2);
  }

  @Test
  void tellsTicketsOfOneInstrumentApart() throws IOException {
    String row = "7,Demo,S1,1,E4,648,0.010,plain-steel,1,move,5.0\n";

    assertThat(Sheets.read(folder, H + row + row.replace("7,Demo", "8,Demo"))).hasSize(2);
  }

  @Test
  void refusesTheSamePassTwiceAndAPassThatIsNone() throws IOException {
    String row = "7,Demo,S1,1,E4,648,0.010,plain-steel,1,move,5.0\n";

    assertThat(Sheets.refusals(folder, H + row + row))
        .extracting(Sheets::brief)
        .containsExactly("3:4 bench.string-twice");
    assertThat(Sheets.refusals(folder, H + row.replace("steel,1", "steel,1.5")))
        .extracting(Sheets::brief)
        .containsExactly("2:9 bench.pass-number");
  }
}
