package sillet.acoustics.findings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sillet.acoustics.pitch.EqualTemperament;

class WorthTest {
  @Test
  void isNothingForWhatASaddleCures() {
    double[] cents = new double[Worth.FRETS + 1];
    double[] cause = new double[Worth.FRETS + 1];
    for (int fret = 1; fret <= Worth.FRETS; fret++) {
      cents[fret] = fret % 2;
      cause[fret] = 5 * (EqualTemperament.ratio(fret) - 1);
    }
    assertThat(Worth.of(cents, cause)).isCloseTo(0, within(1e-12));
  }

  /** One fret of twelve, 2 cents off: rms 2 / sqrt(12), less the little a saddle could help. */
  @Test
  void isTheErrorOfAFretSharedOutOverTwelve() {
    double[] cents = new double[Worth.FRETS + 1];
    cents[5] = 2;
    assertThat(Worth.of(cents, cents)).isBetween(0.9 * 2 / Math.sqrt(12), 2 / Math.sqrt(12));
  }

  /** The same cents at every fret: a saddle takes about three quarters of the squares. */
  @Test
  void isMoreThanHalfOfAnOffset() {
    double[] cents = new double[Worth.FRETS + 1];
    java.util.Arrays.fill(cents, 2);
    assertThat(Worth.of(cents, cents)).isBetween(0.9, 1.2);
  }
}
