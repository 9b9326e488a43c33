package sillet.acoustics.virtual;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BeamStringTest {
  private static final StringEnd PINNED = StringEnd.firm(0);
  private static final StringEnd CLAMPED = StringEnd.firm(1);

  /**
   * Exact eigenvalues: condition of M. B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1),
   * 683 (2024) [S], tan k2 = (k2/k1) tanh k1; numbers solved independently [D].
   */
  @ParameterizedTest
  @CsvSource({
    "0.00236, 1.00239315365, 1.00477004108",
    "0.005, 1.00514930814, 1.01022600792",
    "0.01, 1.01060090422, 1.020914506"
  })
  void hasTheExactFrequencies(double beta, double pinnedClamped, double clampedClamped) {
    assertThat(ratio(beta, PINNED, CLAMPED)).isCloseTo(pinnedClamped, within(1e-9));
    assertThat(ratio(beta, CLAMPED, PINNED)).isCloseTo(pinnedClamped, within(1e-9));
    assertThat(ratio(beta, CLAMPED, CLAMPED)).isCloseTo(clampedClamped, within(2e-9));
  }

  /** Both ends pinned: w = sin, f = f0 sqrt(1 + pi^2 beta^2 q^2) exactly. */
  @Test
  void isExactBetweenPins() {
    BeamString string = new BeamString(0.004 * 0.004, PINNED, PINNED);
    for (int q = 1; q <= 6; q++) {
      double exact = q / 2.0 * Math.sqrt(1 + Math.pow(Math.PI * 0.004 * q, 2));
      assertThat(string.hz(1, 1, 1, q)).isCloseTo(exact, within(1e-12));
    }
  }

  /** A spring end takes its share of what a clamp takes, to first order. */
  @Test
  void aHalfClampTakesHalfTheLength() {
    double none = ratio(0.002, PINNED, PINNED);
    double half = ratio(0.002, StringEnd.firm(0.5), PINNED);
    double whole = ratio(0.002, CLAMPED, PINNED);
    assertThat((half - none) / (whole - none)).isCloseTo(0.5, within(0.005));
  }

  /** A yielding end lengthens a flexible string by T times its give. */
  @Test
  void aYieldingEndLengthensTheString() {
    double give = 1e-4;
    StringEnd soft = new StringEnd(0, omega -> give);
    double ratio = new BeamString(1e-10, soft, PINNED).hz(1, 1, 1, 1) / 0.5;
    assertThat(ratio).isCloseTo(1 / (1 + give), within(1e-7));
  }

  @Test
  void findsTheTensionOfAPitch() {
    BeamString string = new BeamString(4e-4, StringEnd.firm(0.3), CLAMPED);
    double tension = string.tension(82.4, stretched -> 7e-3, 0.65);
    assertThat(string.hz(tension, 7e-3, 0.65, 1)).isCloseTo(82.4, within(1e-8));
  }

  private static double ratio(double beta, StringEnd one, StringEnd other) {
    return new BeamString(beta * beta, one, other).hz(1, 1, 1, 1) / 0.5;
  }
}
