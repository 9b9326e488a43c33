package sillet.desktop.controls;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;

class GaugeTextTest {

  @ParameterizedTest
  @CsvSource({
    ".010, 0.010",
    "0.046in, 0.046",
    "10, 0.010",
    "10.5, 0.0105",
    "46 thou, 0.046",
    "0.66mm, 0.02598",
    "',026', 0.026"
  })
  void readsGaugesAsPeopleSayThem(String typed, double inches) {
    assertThat(GaugeText.parse(typed)).isCloseTo(inches, within(1e-5));
  }

  @ParameterizedTest
  @ValueSource(strings = {"0", "-.010", "thin", "mm"})
  void refusesWhatIsNoGauge(String typed) {
    assertThatThrownBy(() -> GaugeText.parse(typed)).isInstanceOf(Rejection.class);
  }

  @Test
  void saysAGaugeBackInBothUnits() {
    assertThat(GaugeText.said(.010)).isEqualTo(".010 in = 0.25 mm");
  }
}
