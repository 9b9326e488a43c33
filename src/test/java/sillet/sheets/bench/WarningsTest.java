package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.InstanceOfAssertFactories.STRING;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.logbook.text.Texts;

class WarningsTest {
  @TempDir Path folder;

  @ParameterizedTest
  @CsvSource({
    "scale_mm, 25.5, plausible.scale",
    "gauge_in, 10, plausible.gauge",
    "action12_mm, 0.07, plausible.action",
    "nutgap1_mm, 2.5, plausible.clearance",
    "relief_mm, -0.6, plausible.relief",
    "sd_cents, 0, plausible.sd"
  })
  void warnsOfWhatIsUnusualAndTakesIt(String column, String cell, String key) throws IOException {
    assertThat(Sheets.warnings(folder, Sheets.with(column, cell)))
        .extracting(r -> r.message().key())
        .containsExactly(key);
  }

  @Test
  void saysWhere() throws IOException {
    assertThat(Sheets.warnings(folder, Sheets.with("relief_mm", "5")).get(0).said(Texts.english()))
        .isEqualTo(
            "line 2, column 8 (relief_mm): relief of 5.00 mm = 0.197 in; usual is -0.5 mm to 1.5"
                + " mm");
  }

  @Test
  void asksWhetherAThickPlainStringIsWound() throws IOException {
    assertThat(Sheets.warnings(folder, Sheets.with("gauge_in", "0.046")))
        .extracting(remark -> remark.said(Texts.english()))
        .singleElement(STRING)
        .contains(".046", "is the string wound?");
  }

  @Test
  void namesAStringThatHasNoPlaceOnItsInstrument() throws IOException {
    String header = "instrument,string,pitch,scale_mm,gauge_in,construction,f12\n";
    StringBuilder sheet = new StringBuilder(header);
    for (int string : new int[] {1, 2, 3, 4, 9}) {
      sheet.append("Demo,").append(string).append(",G4,670,0.010,plain-steel,1.0\n");
    }
    assertThat(Sheets.warnings(folder, sheet.toString()))
        .extracting(remark -> remark.said(Texts.english()))
        .containsExactly(
            "line 6, column 2 (string): string 9 of an instrument with 5 strings in this sheet;"
                + " the string on the treble side is 1, the next 2");
    String outer = header + "Demo,1,E4,648,0.010,plain-steel,1\nDemo,6,E2,648,.046,wound-steel,2\n";
    assertThat(Sheets.warnings(folder, outer)).isEmpty();
  }

  @Test
  void staysSilentOnAUsualSheet() throws IOException {
    assertThat(Sheets.warnings(folder, Sheets.with("relief_mm", "0.2"))).isEmpty();
  }
}
