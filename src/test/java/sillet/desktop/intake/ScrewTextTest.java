package sillet.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.LengthUnit;

class ScrewTextTest {

  /** Threads: ISO 261 and ASME B1.1 as the list of threads cites them. */
  @ParameterizedTest
  @CsvSource({
    "M3, 0.5",
    "m3, 0.5",
    "'#6-32', 0.79375",
    "6-32, 0.79375",
    "0.5, 0.5",
    "'0,7 mm', 0.7",
    "0.03125in, 0.79375"
  })
  void readsAThreadOrTheWayOfOneTurn(String typed, double mm) {
    assertThat(ScrewText.parse(typed, LengthUnit.MM)).isCloseTo(mm, within(1e-9));
  }

  @ParameterizedTest
  @ValueSource(strings = {"M99", "0", "-0.5", "coarse"})
  void refusesWhatIsNeither(String typed) {
    assertThatThrownBy(() -> ScrewText.parse(typed, LengthUnit.MM)).isInstanceOf(Rejection.class);
  }
}
