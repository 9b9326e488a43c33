package sillet.desktop.sets;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TensionScaleTest {

  @ParameterizedTest
  @CsvSource({
    "72, 75, 25",
    "87.8, 100, 25",
    "101, 125, 25",
    "195, 200, 50",
    "12, 15, 5",
    "0, 5, 5"
  })
  void endsOnAWholeStep(double tension, double most, double step) {
    TensionScale scale = TensionScale.over(tension);

    assertThat(scale.mostN()).isEqualTo(most);
    assertThat(scale.stepN()).isEqualTo(step);
    assertThat(scale.x(tension, 100)).isLessThanOrEqualTo(100);
  }
}
