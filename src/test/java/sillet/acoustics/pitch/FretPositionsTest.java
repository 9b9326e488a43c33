package sillet.acoustics.pitch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("V1: places of frets")
class FretPositionsTest {

  /** G. Byers, "Classical Guitar Intonation", American Lutherie 47 (1996) [S]: 17.817. */
  @Test
  @DisplayName("V1 fret divisor")
  void hasThePublishedDivisor() {
    assertThat(FretPositions.DIVISOR).isCloseTo(17.817, within(0.0005));
  }

  @Test
  @DisplayName("V1 each fret takes one 17.817th of what is left")
  void stepsByTheDivisor() {
    for (int fret = 0; fret < 24; fret++) {
      double left = FretPositions.toSaddle(0.65, fret);
      assertThat(FretPositions.toSaddle(0.65, fret + 1))
          .isCloseTo(left - left / FretPositions.DIVISOR, within(1e-15));
    }
  }

  /**
   * Common practice, no source: a 34 in scale is measured from the saddle as 864, 815, 431, 407.
   */
  @ParameterizedTest(name = "fret {0}: {1} mm")
  @DisplayName("a 34 in scale, within 2 mm (common practice, no source)")
  @CsvSource({"0, 864", "1, 815", "12, 431", "13, 407"})
  void placesTheFretsOfABass(int fret, double millimetres) {
    assertThat(FretPositions.toSaddle(34 * 0.0254, fret) * 1e3).isCloseTo(millimetres, within(2.0));
  }

  @Test
  void putsFretTwelveHalfWay() {
    assertThat(FretPositions.fromNut(0.648, 12)).isEqualTo(0.324);
    assertThat(FretPositions.fromNut(0.648, 0)).isZero();
  }

  @Test
  void refusesFretsAndScalesThatDoNotExist() {
    assertThatThrownBy(() -> FretPositions.toSaddle(0.648, -1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> FretPositions.toSaddle(0.648, 49))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> FretPositions.toSaddle(0, 12))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
