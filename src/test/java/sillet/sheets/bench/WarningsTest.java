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
  void staysSilentOnAUsualSheet() throws IOException {
    assertThat(Sheets.warnings(folder, Sheets.with("relief_mm", "0.2"))).isEmpty();
  }
}
