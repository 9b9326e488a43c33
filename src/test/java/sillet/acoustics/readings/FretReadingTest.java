package sillet.acoustics.readings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FretReadingTest {
  @Test
  void keepsWhatItIsGiven() {
    assertThat(new FretReading(12, -3.5, 0.1)).isEqualTo(new FretReading(12, -3.5, 0.1));
  }

  @ParameterizedTest
  @CsvSource({
    "0, 1, 0.5",
    "37, 1, 0.5",
    "-3, 1, 0.5",
    "12, NaN, 0.5",
    "12, Infinity, 0.5",
    "12, 1, 0",
    "12, 1, -0.5",
    "12, 1, NaN",
    "12, 1, Infinity"
  })
  void rejectsWhatIsNoReading(int fret, double cents, double sd) {
    assertThatThrownBy(() -> new FretReading(fret, cents, sd))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
