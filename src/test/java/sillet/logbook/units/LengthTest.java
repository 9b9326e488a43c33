package sillet.logbook.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;

class LengthTest {
  /** An inch is 25.4 mm exactly (international yard and pound agreement, 1959). */
  @ParameterizedTest
  @CsvSource({
    "1.6,MM,1.6",
    "1.6mm,INCH,1.6",
    "1.6 mm,INCH,1.6",
    ".063in,MM,1.6002",
    "4/64,MM,1.5875",
    "4.5/64,MM,1.7859375",
    "4/64in,MM,1.5875",
    "4,SIXTY_FOURTHS,1.5875",
    "63,THOUSANDTHS,1.6002",
    "10 thou,MM,0.254",
  })
  void readsTheUnitInTheHand(String typed, LengthUnit usual, double mm) {
    assertThat(Length.parse(typed, usual).mm()).isCloseTo(mm, within(1e-9));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "mm", "4/", "/64", "4/0", "1.6cm", "x in"})
  void refusesWhatIsNoLength(String typed) {
    assertThatThrownBy(() -> Length.parse(typed, LengthUnit.MM)).isInstanceOf(Rejection.class);
  }

  @Test
  void keepsWhatWasTyped() {
    assertThat(Length.parse(" 4.5/64 ", LengthUnit.MM).typed()).isEqualTo("4.5/64");
  }

  @Test
  void saysTheOtherUnitBack() {
    assertThat(Length.other(1.5875, LengthUnit.MM)).isEqualTo("0.063 in");
    assertThat(Length.other(1.5875, LengthUnit.SIXTY_FOURTHS)).isEqualTo("1.59 mm");
  }

  @ParameterizedTest
  @CsvSource({
    "1.5875,MM,0.063 in",
    "'1,5875',MM,0.063 in",
    "1.5875mm,INCH,0.063 in",
    "4/64,MM,1.59 mm",
    "4/64in,MM,1.59 mm",
    ".0625in,MM,1.59 mm",
    "62.5 thou,MM,1.59 mm",
    ".0625,INCH,1.59 mm",
    "4,SIXTY_FOURTHS,1.59 mm",
  })
  void saysTheUnitBackThatWasNotTyped(String typed, LengthUnit usual, String other) {
    assertThat(Length.parse(typed, usual).other(usual)).isEqualTo(other);
  }
}
