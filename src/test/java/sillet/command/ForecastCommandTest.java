package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ForecastCommandTest {
  private static final String HEADER =
      "instrument,string,pitch,scale_mm,gauge_in,construction,screw_mm,room_back_mm,f12,"
          + "to_pitch,to_gauge_in,to_construction,to_core_in,to_action12_mm\n";

  @TempDir private Path folder;

  @Test
  void answersFromThePacketWithoutAnyReading() throws IOException {
    Run run =
        Run.of(
            "forecast",
            sheet(
                """
                instrument,string,pitch,scale_mm,gauge_in,construction,to_pitch
                Demo,1,E4,648,0.010,plain-steel,D4
                Demo,2,B3,648,0.013,plain-steel,A3
                """));
    List<String> rows = run.out().lines().toList();
    assertThat(run.code()).isZero();
    assertThat(run.err()).isEmpty();
    assertThat(rows).hasSize(3);
    assertThat(rows.get(0))
        .isEqualTo(
            "instrument,string,saddle_move_mm,saddle_low_mm,saddle_high_mm,turns,direction,"
                + "nut_move_mm,cents12_before,cents12_after,rms_before,rms_after,verdict,findings,"
                + "note");
    // a tone lower is 2^(-1/6) in pitch, its square in tension: 72.x N become 57.x N [D]
    assertThat(rows.get(1)).contains("Tension 72.", "N now -> 57.", "N then: lighter.");
    assertThat(rows).noneMatch(row -> row.contains("NaN") || row.contains("Infinity"));
  }

  @Test
  void saysTheMoveFromWhereTheSaddleStandsAndWhetherItFits() throws IOException {
    Run run =
        Run.of(
            "forecast",
            sheet(
                HEADER
                    + "Demo,3,G3,648,0.017,plain-steel,0.5,6,0.0,,0.020,wound-nickel,,\n"
                    + "Demo,6,E2,648,0.046,wound-nickel,0.5,0.1,4.0,,,,,\n"));
    List<String> rows = run.out().lines().toList();
    // a wound third wants its saddle nearer the neck than a plain one (common practice, no source)
    assertThat(rows.get(1))
        .contains(",toward neck,", ",move,", "filed for .017, a .020", "between plain and wound");
    // nothing changes on string 6: what it wants is what its reading says, and it does not fit
    assertThat(rows.get(2)).contains(",away from neck,", ",no-room,", "only 0.10 mm are left");
    assertThat(run.code()).isZero();
  }

  @Test
  void aChangeOfActionAloneSaysWhatItShifts() throws IOException {
    Run run =
        Run.of("forecast", sheet(HEADER + "Demo,1,E4,648,0.010,plain-steel,0.5,6,0.0,,,,,2.6\n"));
    assertThat(run.out())
        .contains("The gap over fret 12 from", "to 2.60 mm", "settle heights before the saddle")
        .contains("relief usually stays")
        .doesNotContain("pull");
  }

  @Test
  void flagsAStringThatWouldBreak() throws IOException {
    Run run =
        Run.of("forecast", sheet(HEADER + "Demo,1,E4,648,0.010,plain-steel,0.5,6,0.0,D5,,,,\n"));
    assertThat(run.out()).contains("% of its breaking tension: it breaks");
    assertThat(run.code()).isZero();
  }

  @Test
  void writesTheSameIntoAFileAndNothingElse() throws IOException {
    String sheet = sheet(HEADER + "Demo,1,E4,648,0.010,plain-steel,0.5,6,0.0,D4,,,,\n");
    Path out = folder.resolve("forecast.csv");
    Run printed = Run.of("forecast", sheet);
    Run written = Run.of("forecast", sheet, "--out", out.toString());
    assertThat(written.code()).isZero();
    assertThat(written.out()).isEmpty();
    assertThat(Files.readString(out)).isEqualTo(printed.out());
    Run same = Run.of("forecast", sheet, "--out", sheet);
    assertThat(same.code()).isEqualTo(2);
    assertThat(same.err()).contains("name another file");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "Demo,1,E4,0,0.010,plain-steel,0.5,6,0.0,,,,,",
        "Demo,6,E2,648,0.046,wound-nickel,0.5,6,0.0,,0.049,,0.049,",
        "Demo,1,E4,648,0.010,plain-steel,0.5,6,0.0,H4,,,,",
        "Demo,1,E4,648,0.010,plain-steel,0.5,6,0.0,,NaN,,,",
        "Demo,1,E4,648,0.010,plain-steel,0.5,6,0.0,,,,,high"
      })
  void refusesWhatCannotBeWithASentenceAndNoRow(String row) throws IOException {
    Run run = Run.of("forecast", sheet(HEADER + row + "\n"));
    assertThat(run.code()).isEqualTo(2);
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).contains("line 2, column ");
  }

  @Test
  void refusesAMissingFileAndNoFile() {
    Run missing = Run.of("forecast", folder.resolve("none.csv").toString());
    assertThat(missing.code()).isEqualTo(2);
    assertThat(missing.out()).isEmpty();
    assertThat(Run.of("forecast").code()).isEqualTo(2);
  }

  @Test
  void readingsThatContradictEachOtherGiveNoNaN() throws IOException {
    String header =
        "instrument,string,pitch,scale_mm,gauge_in,construction,f5,f7,f12,to_gauge_in\n";
    Run run =
        Run.of("forecast", sheet(header + "Demo,1,E4,648,0.010,plain-steel,40,-40,40/-40,0.011\n"));
    assertThat(run.code()).isZero();
    assertThat(run.out()).contains(",reading,").doesNotContain("NaN");
  }

  private String sheet(String text) throws IOException {
    return Files.writeString(folder.resolve("bench.csv"), text).toString();
  }
}
