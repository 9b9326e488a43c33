package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.sheets.csv.Remark;
import sillet.sheets.csv.Remarks;
import sillet.sheets.csv.SheetRefused;

/** Sheets that are refused for more than one cell. */
class RefusedSheetsTest {
  private static final String H = Sheets.HEADER + "\n";

  @TempDir Path folder;

  @Test
  void refusesAnEmptyFileAHeaderAloneAndBlankRows() throws IOException {
    assertThat(brief("")).containsExactly("0:0 bench.empty");
    assertThat(brief("\ufeff\n \n,,,\n")).containsExactly("0:0 bench.empty");
    assertThat(brief(Sheets.HEADER)).containsExactly("1:0 bench.no-row");
    assertThat(brief(H + "\n,,,,,,\n")).containsExactly("1:0 bench.no-row");
  }

  @Test
  void refusesASheetThatBeginsWithARow() throws IOException {
    assertThat(brief(Sheets.ROW + "\n")).containsExactly("1:0 bench.no-header");
    assertThat(brief((H + Sheets.ROW).replace(',', '\t'))).containsExactly("1:0 bench.tabs");
  }

  @Test
  void refusesMissingUnknownAndDoubleColumnsAtOnce() throws IOException {
    assertThat(brief("instrument,String ,F12,gage_in,f12,note,f25\nDemo,1,2,3,4,,5\n"))
        .containsExactly(
            "1:4 bench.column-unknown",
            "1:5 bench.column-twice",
            "1:7 bench.column-unknown",
            "1:0 bench.column-missing",
            "1:0 bench.column-missing",
            "1:0 bench.column-missing",
            "1:0 bench.column-missing");
  }

  @Test
  void namesTheNearestColumn() throws IOException {
    Remark refusal = Sheets.refusals(folder, "gage_in," + H + ",Demo\n").get(0);

    assertThat(refusal.message().values()).containsExactly("gage_in", "gauge_in");
  }

  @Test
  void refusesASheetWithoutAColumnForReadings() throws IOException {
    assertThat(brief(H.replace("f12", "f0") + Sheets.ROW + "\n"))
        .contains("1:0 bench.no-fret-column");
  }

  @Test
  void refusesACellUnderNoName() throws IOException {
    assertThat(brief(H + "Demo,1,E4,648,0.010,plain-steel,3,1\n"))
        .containsExactly("2:8 bench.cell-unnamed");
    assertThat(brief(",,\n," + H + "x,Demo,1,E4,648,0.010,plain-steel,3\n"))
        .containsExactly("3:1 bench.cell-unnamed");
    assertThat(brief("," + H + ",Demo,1,E4,648,0.010,plain-steel,3,,\n")).isEmpty();
  }

  @Test
  void refusesTheSameStringTwiceWhereverItStands() throws IOException {
    String other = Sheets.ROW.replace("Demo", "Other");

    assertThat(brief(H + Sheets.ROW + "\n" + other + "\n" + Sheets.ROW + "\n" + other + "\n"))
        .containsExactly("4:2 bench.string-twice", "5:2 bench.string-twice");
    assertThat(brief(H + Sheets.ROW + "\n" + Sheets.ROW.replace(",1,", ",01,") + "\n"))
        .containsExactly("3:2 bench.string-twice");
  }

  @Test
  void refusesAnInstrumentWithoutAnyReading() throws IOException {
    String unread = "Silent,1,E4,648,0.010,plain-steel,\n";
    String half = "Demo,2,B3,648,0.013,plain-steel,\n";

    assertThat(brief(H + unread + Sheets.ROW + "\n" + half))
        .containsExactly("2:1 bench.instrument-unread");
    assertThat(brief(H + half + unread.replace("Silent", "A") + Sheets.ROW + "\n"))
        .containsExactly("3:1 bench.instrument-unread");
  }

  @Test
  void saysEverythingAtOnce() throws IOException {
    assertThat(brief(H + ",x,H4,0,NaN,wood,200\n\nDemo,0,E4,648,0.010,plain-steel,1\n"))
        .containsExactly(
            "2:1 bench.cell-blank",
            "2:2 bench.string-number",
            "2:3 pitch.none",
            "2:4 bench.not-above-zero",
            "2:5 number.none",
            "2:6 bench.word-unknown",
            "2:7 cents.too-far",
            "4:2 bench.string-number");
  }

  @Test
  void listsTheFirstAndCountsTheOthers() throws IOException {
    String bad = "Demo,0,E4,648,0.010,plain-steel,1\n";
    Path path = Sheets.write(folder, H + bad.repeat(Remarks.LISTED + 25));

    assertThatThrownBy(() -> BenchSheet.open(path, SheetUse.MOVES))
        .isInstanceOfSatisfying(
            SheetRefused.class,
            refused -> {
              assertThat(refused.reasons()).hasSize(Remarks.LISTED);
              assertThat(refused.more()).isEqualTo(25);
            });
  }

  @Test
  void refusesABrokenLineTogetherWithTheOthers() throws IOException {
    assertThat(
            brief(H + "Demo,0,E4,648,0.010,plain-steel,1\n" + "x".repeat(100_000) + "\nDe\"mo,1\n"))
        .containsExactly(
            "2:2 bench.string-number", "3:0 sheet.line-too-long", "4:3 sheet.stray-quote");
  }

  @Test
  void doesNotCallASheetOfOneEndlessLineEmpty() throws IOException {
    assertThat(brief("x".repeat(100_000))).containsExactly("1:0 sheet.line-too-long");
  }

  @Test
  void refusesACellOfTenMillionCharacters() throws IOException {
    String cell = "x".repeat(10_000_000);

    assertThat(brief(H + Sheets.ROW.replace("Demo", cell) + "\n"))
        .contains("2:0 sheet.line-too-long");
    assertThat(brief(H + Sheets.ROW.replace("Demo", '"' + cell + '"') + "\n"))
        .contains("2:0 sheet.line-too-long");
    assertThat(brief(H + "\"" + "x\n".repeat(5_000_000) + "\"\n"))
        .containsExactly("2:1 sheet.quote-open");
  }

  @Test
  void refusesWhatIsNoFile() throws IOException {
    assertThat(refusedFor(folder.resolve("none.csv"))).isEqualTo("file.missing");
    assertThat(refusedFor(folder)).isEqualTo("file.folder");
    assertThat(refusedFor(Path.of("/dev/null"))).isEqualTo("file.not-plain");
  }

  @Test
  void refusesOtherEncodings() throws IOException {
    String sheet = H + Sheets.ROW.replace("Demo", "D\u00e9mo") + "\n";

    assertThat(refusedFor(write(sheet.getBytes(StandardCharsets.ISO_8859_1))))
        .isEqualTo("sheet.not-utf8");
    assertThat(refusedFor(write(sheet.getBytes(StandardCharsets.UTF_16LE))))
        .isEqualTo("sheet.utf16-unmarked");
    assertThat(refusedFor(write(sheet.replace('\u00e9', '\0').getBytes(StandardCharsets.UTF_8))))
        .isEqualTo("sheet.no-text");
  }

  private Path write(byte[] bytes) throws IOException {
    return Files.write(folder.resolve("bench.csv"), bytes);
  }

  private static String refusedFor(Path path) throws IOException {
    try {
      BenchSheet.open(path, SheetUse.MOVES).close();
      return "taken";
    } catch (SheetRefused refused) {
      return refused.reasons().get(0).message().key();
    }
  }

  private List<String> brief(String sheet) throws IOException {
    return Sheets.refusals(folder, sheet).stream().map(Sheets::brief).toList();
  }
}
