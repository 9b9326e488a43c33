package sillet.desktop.controls;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EighthsTest {

  @ParameterizedTest
  @CsvSource({
    "3.72, 3 3/4, 3.75",
    "2.38, 2 3/8, 2.375",
    "-1.51, 1 1/2, 1.5",
    "0.99, 1, 1",
    "0.06, 0, 0",
    "0.07, 1/8, 0.125",
    "1.94, 2, 2"
  })
  void writesTheNearestEighthInLowestTerms(double turns, String written, double rounded) {
    Eighths eighths = Eighths.of(turns);
    assertThat(eighths.written()).isEqualTo(written);
    assertThat(eighths.turns()).isEqualTo(rounded);
    assertThat(eighths.none()).isEqualTo(rounded == 0);
  }
}
