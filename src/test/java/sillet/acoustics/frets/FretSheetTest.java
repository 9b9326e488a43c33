package sillet.acoustics.frets;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class FretSheetTest {

  /** Divisor 17.817: G. Byers, American Lutherie 47 (1996) [S]. */
  @Test
  void eachFretTakesOneSeventeenthOfWhatIsLeft() {
    FretSheet sheet = FretSheet.of(0.648, 24);

    double left = 0.648;
    for (FretSheet.Line line : sheet.lines()) {
      assertThat(line.fromBefore()).isCloseTo(left / 17.817, within(1e-6));
      left -= line.fromBefore();
      assertThat(line.fromNut()).isCloseTo(0.648 - left, within(1e-12));
    }
  }

  @Test
  void placesTwelveAndTwentyFourByHalves() {
    FretSheet sheet = FretSheet.of(0.648, 24);

    assertThat(sheet.lines().get(11).fromNut()).isCloseTo(0.324, within(1e-12));
    assertThat(sheet.lines().get(23).fromNut()).isCloseTo(0.486, within(1e-12));
    assertThat(sheet.lines().get(11).toLast()).isCloseTo(0.162, within(1e-12));
    assertThat(sheet.lines().get(23).toLast()).isZero();
  }

  @Test
  void laysOutAnyNumberOfFrets() {
    assertThat(FretSheet.of(0.35, 1).lines()).hasSize(1);
    assertThat(FretSheet.of(0.9, 48).lines()).hasSize(48);
  }

  @Test
  void refusesWhatIsNoBoard() {
    assertThatThrownBy(() -> FretSheet.of(0.648, 0)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> FretSheet.of(0.648, 49)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> FretSheet.of(-1, 12)).isInstanceOf(IllegalArgumentException.class);
  }
}
