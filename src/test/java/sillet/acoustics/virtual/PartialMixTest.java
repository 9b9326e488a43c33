package sillet.acoustics.virtual;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class PartialMixTest {
  private static final double B = 2e-4;

  /** Partial q of a stiff string stands 600 log2((1 + B q^2)/(1 + B)) cents above q times one. */
  @Test
  void aSharpPartialSharpensWhatIsHeardByItsShare() {
    double heard = new PartialMix(0.2, 0.1).heard(PartialMixTest::stiff, 1);
    double second = Math.log((1 + 4 * B) / (1 + B)) / 2;
    double third = Math.log((1 + 9 * B) / (1 + B)) / 2;
    assertThat(Math.log(heard / stiff(1))).isCloseTo(0.2 * second + 0.1 * third, within(1e-12));
  }

  @Test
  void theHarmonicOverFretTwelveHasPartialsOfItsOwn() {
    double heard = new PartialMix(1, 0).heard(PartialMixTest::stiff, 2);
    assertThat(heard).isCloseTo(stiff(4) / 2, within(1e-9));
  }

  private static double stiff(int mode) {
    return 100 * mode * Math.sqrt(1 + B * mode * mode);
  }
}
