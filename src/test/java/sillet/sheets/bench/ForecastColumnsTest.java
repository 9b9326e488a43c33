package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.acoustics.wire.Construction;
import sillet.logbook.forecast.StringChange;
import sillet.logbook.strings.FittedString;
import sillet.sheets.csv.Remark;
import sillet.sheets.csv.Remarks;
import sillet.sheets.csv.SheetRefused;

/** Columns that say what a string will be; rules and refusals as in the contract of the files. */
class ForecastColumnsTest {
  private static final String HEADER =
      "instrument,string,pitch,scale_mm,gauge_in,construction,core_in,unit_mass_g_m,action12_mm,"
          + "to_pitch,to_gauge_in,to_construction,to_core_in,to_unit_mass_g_m,to_action12_mm\n";

  @TempDir private Path folder;

  @Test
  void readsWhatAStringWillBeWithoutAnyReading() throws IOException {
    SheetString row =
        read("Demo,6,E2,648,0.046,wound-nickel,0.018,6.4,1.8,D2,.052,wound-steel,.019,8.1,2.1");
    StringChange change = row.change();
    assertThat(change.string()).isEqualTo(6);
    assertThat(change.pitch()).isNotNull();
    FittedString then = change.fitted(row.string().string());
    assertThat(then.pitch().typed()).isEqualTo("D2");
    assertThat(then.scaleMm()).isEqualTo(648);
    assertThat(then.make().gaugeIn()).isEqualTo(0.052);
    assertThat(then.make().construction()).isEqualTo(Construction.WOUND_STEEL);
    assertThat(then.make().coreIn()).isEqualTo(0.019);
    assertThat(then.make().unitMassGPerM()).isEqualTo(8.1);
    assertThat(change.action12Mm()).isEqualTo(2.1);
  }

  @Test
  void blankIsUnchangedAndCoreAndMassOnlyWhereTheStringIs() throws IOException {
    SheetString same = read("Demo,6,E2,648,0.046,wound-nickel,0.018,6.4,1.8,,,,,,");
    assertThat(same.change().fitted(same.string().string())).isEqualTo(same.string().string());
    SheetString tuned = read("Demo,6,E2,648,0.046,wound-nickel,0.018,6.4,1.8,D2,0.046,,,,");
    assertThat(tuned.change().fitted(tuned.string().string()).make())
        .isEqualTo(tuned.string().string().make());
    SheetString thicker = read("Demo,6,E2,648,0.046,wound-nickel,0.018,6.4,1.8,,0.052,,,,");
    assertThat(thicker.change().make(thicker.string().string().make()).coreIn()).isNull();
    assertThat(thicker.change().make(thicker.string().string().make()).unitMassGPerM()).isNull();
    SheetString wrapped = read("Demo,6,E2,648,0.046,wound-nickel,0.018,6.4,1.8,,,wound-steel,,,");
    assertThat(wrapped.change().make(wrapped.string().string().make()).coreIn()).isNull();
  }

  @ParameterizedTest
  @CsvSource({
    "to_pitch, H9, pitch.none",
    "to_gauge_in, 0, bench.not-above-zero",
    "to_gauge_in, thick, number.none",
    "to_gauge_in, NaN, number.none",
    "to_construction, wood, bench.word-unknown",
    "to_core_in, 0.046, string.core-too-thick",
    "to_core_in, 0.060, string.core-too-thick",
    "to_core_in, -1, bench.not-above-zero",
    "to_unit_mass_g_m, 0, bench.not-above-zero",
    "to_action12_mm, high, number.none",
    "to_action12_mm, Infinity, number.none"
  })
  void refusesWithLineAndColumnWhatNoStringCanBe(String column, String cell, String key)
      throws IOException {
    String sheet =
        "instrument,string,pitch,scale_mm,gauge_in,construction,"
            + column
            + "\nDemo,6,E2,648,0.046,wound-nickel,"
            + cell
            + "\n";
    List<Remark> refused = refusals(sheet, SheetUse.FORECAST);
    assertThat(refused).hasSize(1);
    assertThat(Sheets.brief(refused.get(0))).isEqualTo("2:7 " + key);
    assertThat(refused.get(0).place().header()).isEqualTo(column);
  }

  @Test
  void refusesACoreThatDoesNotFitTheNewGauge() throws IOException {
    String sheet = HEADER + "Demo,6,E2,648,0.046,wound-nickel,0.018,,,,0.017,,.018,,\n";
    assertThat(refusals(sheet, SheetUse.FORECAST))
        .extracting(Sheets::brief)
        .containsExactly("2:13 string.core-too-thick");
    String plain = HEADER + "Demo,1,E4,648,0.010,plain-steel,,,,,0.011,,.010,,\n";
    assertThat(refusals(plain, SheetUse.FORECAST))
        .extracting(Sheets::brief)
        .containsExactly("2:13 string.core-of-plain");
  }

  @Test
  void movesReadNoneOfThemAndNeedAReading() throws IOException {
    String sheet = HEADER + "Demo,6,E2,648,0.046,wound-nickel,,,,H9,thick,,,,\n";
    assertThat(refusals(sheet, SheetUse.MOVES))
        .extracting(Sheets::brief)
        .containsExactly("1:0 bench.no-fret-column");
  }

  @Test
  void warnsOfWhatIsOnlyUnusual() throws IOException {
    String sheet = HEADER + "Demo,1,E4,648,0.010,plain-steel,,,,,0.400,,,,40\n";
    try (BenchSheet bench = BenchSheet.open(Sheets.write(folder, sheet), SheetUse.FORECAST)) {
      Remarks warnings = bench.warnings();
      assertThat(warnings.listed())
          .extracting(remark -> remark.place().header())
          .contains("to_gauge_in", "to_action12_mm");
    }
  }

  private SheetString read(String row) throws IOException {
    List<SheetString> rows = new ArrayList<>();
    Path path = Sheets.write(folder, HEADER + row + "\n");
    try (BenchSheet bench = BenchSheet.open(path, SheetUse.FORECAST)) {
      bench.inOrder(one -> one, rows::add);
    }
    assertThat(rows).hasSize(1);
    return rows.get(0);
  }

  private List<Remark> refusals(String sheet, SheetUse use) throws IOException {
    try {
      BenchSheet.open(Sheets.write(folder, sheet), use).close();
      return List.of();
    } catch (SheetRefused refused) {
      return refused.reasons();
    }
  }
}
