package sillet.sheets.job;

import static org.assertj.core.api.Assertions.assertThat;

import com.opencsv.RFC4180Parser;
import java.io.IOException;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.moves.BenchString;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.Moment;
import sillet.sheets.bench.BenchSheet;
import sillet.sheets.bench.SheetUse;

class JobSheetTest {
  private static final String HEADER =
      "ticket,taken_in,handed_out,technician,customer,instrument,serial,string,pitch,scale_mm,"
          + "gauge_in,construction,set,pass,against,cents12,tries,sd_cents,saddle_move_mm,turns,"
          + "direction,nut_move_mm,verdict,findings,cents12_predicted,cents12_left,"
          + "action12_received_mm,action12_left_mm,relief_received_mm,relief_left_mm,"
          + "humidity_pct,temperature_c,note";

  @TempDir Path folder;
  private final DemoVisit visit = new DemoVisit();

  @Test
  void hasTheColumnsOfTheContractAndThenTheFretsThatWereRead() throws IOException {
    assertThat(sheet().lines().findFirst()).contains(HEADER);

    visit.read(1, 1, 12, "5.0");
    visit.read(1, 2, 5, "1.0");
    visit.read(1, 2, 0, "0.2");
    assertThat(sheet().lines().findFirst()).contains(HEADER + ",f0,f5,f12");
  }

  @Test
  void hasARowForEveryStringThoughNothingWasRead() throws IOException {
    List<Map<String, String>> rows = rows();

    assertThat(rows).hasSize(2);
    assertThat(rows.get(0))
        .containsEntry("ticket", "42")
        .containsEntry("taken_in", "2026-01-15")
        .containsEntry("handed_out", "2026-01-17")
        .containsEntry("technician", "Ilse (demo)")
        .containsEntry("customer", "Ada Example (demo)")
        .containsEntry("instrument", "Plover (demo)")
        .containsEntry("serial", "D-1")
        .containsEntry("string", "1")
        .containsEntry("pitch", "E4")
        .containsEntry("scale_mm", "648")
        .containsEntry("gauge_in", "0.010")
        .containsEntry("construction", "plain-steel")
        .containsEntry("set", "Light (demo)")
        .containsEntry("pass", "1")
        .containsEntry("humidity_pct", "47")
        .containsEntry("temperature_c", "20.5");
    assertThat(rows.get(0)).containsEntry("against", "").containsEntry("cents12", "");
    assertThat(rows.get(1)).containsEntry("string", "2").containsEntry("scale_mm", "647.7");
  }

  @Test
  void saysWhatWasReadDonePredictedAndLeft() throws IOException {
    visit.read(1, 1, 12, "5.0/5.4/5.2");
    visit.move(1, 1, 1.9, 3.75);
    visit.read(2, 1, 12, "0.2");

    List<Map<String, String>> rows = rows();

    assertThat(rows)
        .extracting(row -> row.get("string") + row.get("pass"))
        .containsExactly("11", "21", "12");
    assertThat(rows.get(0))
        .containsEntry("against", "open")
        .containsEntry("cents12", "5.20")
        .containsEntry("tries", "3")
        .containsEntry("sd_cents", "0.3")
        .containsEntry("f12", "5.0/5.4/5.2")
        .containsEntry("saddle_move_mm", "1.900")
        .containsEntry("turns", "3.75")
        .containsEntry("direction", "away from neck")
        .containsEntry("verdict", "move")
        .containsEntry("cents12_left", "0.20");
    assertThat(Double.parseDouble(rows.get(0).get("cents12_predicted"))).isBetween(-0.2, 0.2);
    assertThat(rows.get(0).get("note")).endsWith("Moved 1.90 mm away from neck.");
    assertThat(rows.get(2))
        .containsEntry("verdict", "leave")
        .containsEntry("cents12", "0.20")
        .containsEntry("cents12_left", "0.20");
    assertThat(rows.get(2).get("note")).startsWith("Within 1 cent");
  }

  @Test
  void saysSoWhenAnAdvisedMoveIsNotWrittenDown() throws IOException {
    visit.read(1, 1, 12, "5.0");

    Map<String, String> row = rows().get(0);

    assertThat(row.get("saddle_move_mm")).startsWith("1.8");
    assertThat(row.get("turns")).startsWith("3.7");
    assertThat(row)
        .containsEntry("cents12_predicted", "0.00")
        .containsEntry("cents12_left", "5.00");
    assertThat(row.get("note")).endsWith("No move is written down for this pass.");
  }

  @Test
  void leavesBlankWhatNobodyReadAfterTheMove() throws IOException {
    visit.read(1, 1, 12, "5.0");
    visit.move(1, 1, 1.0, null);
    visit.move(1, 1, 0.5, null);

    Map<String, String> row = rows().get(0);

    assertThat(row)
        .containsEntry("saddle_move_mm", "1.500")
        .containsEntry("turns", "3.00")
        .containsEntry("cents12_left", "");
  }

  @Test
  void saysChecksOnlyWhereTheyWereMeasured() throws IOException {
    visit.check(CheckKind.ACTION, 2, Moment.RECEIVED, 2.1);
    visit.check(CheckKind.ACTION, 2, Moment.RECEIVED, 2.2);
    visit.check(CheckKind.ACTION, 2, Moment.LEFT, 1.9);
    visit.check(CheckKind.RELIEF, 0, Moment.LEFT, 0.2);

    List<Map<String, String>> rows = rows();

    assertThat(rows.get(0))
        .containsEntry("action12_received_mm", "")
        .containsEntry("relief_left_mm", "0.2");
    assertThat(rows.get(1))
        .containsEntry("action12_received_mm", "2.2")
        .containsEntry("action12_left_mm", "1.9")
        .containsEntry("relief_received_mm", "")
        .containsEntry("relief_left_mm", "0.2");
  }

  @Test
  void saysHertzWhereTheNoteWouldMeanAnotherPitch() throws IOException {
    visit.referenceHz = 442;

    // E4 is seven semitones below A4: 442 x 2^(-5/12) by equal temperament
    assertThat(rows().get(0)).containsEntry("pitch", "331.1259");
  }

  @Test
  void guardsNamesThatASpreadsheetWouldReckonWith() throws IOException {
    visit.customer = "=HYPERLINK(\"x\")";
    visit.model = "@demo\nmodel";

    assertThat(rows().get(0))
        .containsEntry("customer", "'=HYPERLINK(\"x\")")
        .containsEntry("instrument", "'@demo model");
  }

  @Test
  void isReadBackAsABenchSheetByItsLastPass() throws IOException {
    visit.model = "=demo";
    visit.read(1, 1, 12, "5.0/5.4/5.2");
    visit.read(1, 2, 12, "-2.0");
    visit.read(1, 2, 5, "-1.0");
    visit.move(1, 1, 1.9, 3.8);
    visit.read(2, 1, 12, "0.2");
    visit.read(2, 1, 0, "0.1");
    Path path = Files.writeString(folder.resolve("job.csv"), sheet());

    List<BenchString> read = new ArrayList<>();
    try (BenchSheet bench = BenchSheet.open(path, SheetUse.MOVES)) {
      bench.inOrder(one -> one, row -> read.add(row.string()));
    }

    List<BenchString> now = List.of(pass(0, 1), pass(1, 0));
    assertThat(read)
        .extracting(BenchString::string)
        .isEqualTo(now.stream().map(BenchString::string).toList());
    assertThat(read)
        .extracting(BenchString::readings)
        .isEqualTo(now.stream().map(BenchString::readings).toList());
    assertThat(read).extracting(BenchString::instrument).containsOnly("=demo");
  }

  private BenchString pass(int pass, int string) {
    return visit.passes().get(pass).get(string).string();
  }

  private String sheet() throws IOException {
    StringWriter out = new StringWriter();
    JobSheet.write(out, visit.record(), visit.passes(), Texts.english());
    return out.toString();
  }

  private List<Map<String, String>> rows() throws IOException {
    List<String> lines = sheet().lines().toList();
    RFC4180Parser parser = new RFC4180Parser();
    String[] header = parser.parseLine(lines.get(0));
    List<Map<String, String>> rows = new ArrayList<>();
    for (String line : lines.subList(1, lines.size())) {
      String[] cells = parser.parseLine(line);
      Map<String, String> row = new LinkedHashMap<>();
      for (int i = 0; i < header.length; i++) {
        row.put(header[i], cells[i]);
      }
      rows.add(row);
    }
    return rows;
  }
}
