package sillet.desktop.drawing;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ScreenDotsTest {
  @ParameterizedTest
  @CsvSource({"96, 96", "144, 144", "0, 96", "-1, 96", "25, 96", "1000, 96", "NaN, 96"})
  void anUnbelievableScreenCountsAsNinetySixDotsAnInch(double said, double taken) {
    assertThat(ScreenDots.believable(said)).isEqualTo(taken);
  }
}
