package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestTest {
  @ParameterizedTest
  @CsvSource({
    "guage_in, gauge_in",
    "scale, scale_mm",
    "instr, instrument",
    "f25, f2",
    "unit_mass, unit_mass_g_m",
    "action_mm, action12_mm",
    "constuction, construction"
  })
  void findsWhatWasMeant(String written, String meant) {
    assertThat(Nearest.of(written, Columns.KNOWN)).isEqualTo(meant);
  }

  @Test
  void countsLettersPutInLeftOutAndExchanged() {
    assertThat(Nearest.changes("", "abc")).isEqualTo(3);
    assertThat(Nearest.changes("nut", "nut")).isZero();
    assertThat(Nearest.changes("saddle", "sadle")).isEqualTo(1);
    assertThat(Nearest.changes("fret", "frut")).isEqualTo(1);
  }
}
