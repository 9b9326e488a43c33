package sillet.acoustics.wire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.tables.PublishedString;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;

@DisplayName("V5, V6: stiffness from stretching")
class StretchMeasurementTest {

  private static final double MARK = 0.614;
  private static final double[] DISPLACEMENT = {0, 0.5e-3, 1e-3, 1.5e-3, 2e-3, 2.5e-3, 3e-3};

  static List<Row> stretched() {
    return Tables.read("stretch-2024.csv");
  }

  static List<PublishedString> published() {
    return PublishedString.all();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("stretched")
  @DisplayName("V5 R from raw stretch data")
  void findsThePublishedSensitivity(Row row) {
    double[] hz = row.numbers("at_0.0", "at_0.5", "at_1.0", "at_1.5", "at_2.0", "at_2.5", "at_3.0");
    double nominal = PublishedString.hz(row.text("note"));
    assertThat(StretchMeasurement.sensitivity(DISPLACEMENT, hz, MARK, nominal))
        .isCloseTo(row.number("r"), within(0.15));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("published")
  @DisplayName("V6 kappa, beta and modulus from R")
  void derivesThePublishedConstants(PublishedString string) {
    double kappa = StretchMeasurement.kappa(string.row().number("r"));
    double area = CoreShape.ROUND.area(2 * string.radius());
    assertThat(kappa).isCloseTo(string.kappa(), within(0.2));
    assertThat(Math.sqrt(kappa) * string.radius() / (2 * PublishedString.SCALE))
        .isCloseTo(string.beta(), within(1.1e-5));
    assertThat(kappa * string.tension() / area / 1e9)
        .isCloseTo(string.row().number("modulus_gpa"), within(0.06));
  }

  @Test
  void refusesDataWithoutAStretch() {
    assertThatThrownBy(
            () -> StretchMeasurement.sensitivity(new double[] {1}, new double[] {1}, 1, 1))
        .isInstanceOf(IllegalArgumentException.class);
    double[] still = {0, 0};
    assertThatThrownBy(() -> StretchMeasurement.sensitivity(still, new double[] {100, 101}, 1, 100))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("not displaced");
    assertThatThrownBy(() -> StretchMeasurement.sensitivity(still, still, 0, 100))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
