package sillet.acoustics.findings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;

class RippleShapesTest {
  /** Rayleigh's quotient for a small change of mass, summed numerically [D]. */
  @ParameterizedTest
  @CsvSource({"0, 0.15, 1", "5, 0.37, 7", "10, 0.93, 12", "7, 0.54, 19"})
  void followTheMotionOfTheString(int wave, double share, int fret) {
    double sounding = 1 / EqualTemperament.ratio(fret);
    for (boolean cosine : new boolean[] {false, true}) {
      double expected =
          -Cents.PER_UNIT / 2 * (summed(share, cosine, sounding) - summed(share, cosine, 1));
      assertThat(RippleShapes.cents(wave, cosine, fret)).isCloseTo(expected, within(1e-2));
    }
  }

  /** "Several cents" of a swing of 1.5 % of the mass. */
  @ParameterizedTest
  @CsvSource({"5", "7", "9"})
  void makeSeveralCentsOfASwingOfOneAndAHalfPerCent(int wave) {
    double widest = 0;
    for (int fret = 1; fret <= 17; fret++) {
      double sine = RippleShapes.cents(wave, false, fret);
      double cosine = RippleShapes.cents(wave, true, fret);
      widest = Math.max(widest, 0.015 * Math.hypot(sine, cosine));
    }
    assertThat(widest).isBetween(3.0, 20.0);
  }

  private static double summed(double wave, boolean cosine, double length) {
    int parts = 20_000;
    double sum = 0;
    for (int i = 0; i < parts; i++) {
      double z = length * (i + 0.5) / parts;
      double angle = 2 * Math.PI * z / wave;
      double motion = Math.sin(Math.PI * z / length);
      sum += (cosine ? Math.cos(angle) : Math.sin(angle)) * 2 * motion * motion / parts;
    }
    return sum;
  }
}
