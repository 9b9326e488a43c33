package sillet.acoustics.virtual;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.linear.EigenDecompositionSymmetric;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.junit.jupiter.api.Test;

class MassRippleTest {
  private static final double LENGTH = 0.43;

  /** A chain of beads, w'' = -(omega/c)^2 (1 + ripple) w, solved as a matrix. */
  @Test
  void agreesWithAChainOfBeads() {
    MassRipple ripple = new MassRipple(0.015, 0.31, 0.7);
    double even = lowest(MassRipple.NONE);
    assertThat(lowest(ripple) / even).isCloseTo(ripple.factor(LENGTH, 1), within(3e-5));
    // 26 cents would be the whole deviation; this one does something
    assertThat(Math.abs(1 - ripple.factor(LENGTH, 1))).isGreaterThan(1e-3);
  }

  /** Mass spread evenly at 1 + share: the frequency falls by half of it. */
  @Test
  void aVeryLongWaveIsOnlyMoreMass() {
    MassRipple ripple = new MassRipple(0.01, 1e4, Math.PI / 2);
    assertThat(ripple.factor(LENGTH, 1)).isCloseTo(0.995, within(1e-6));
    assertThat(ripple.factor(LENGTH, 3)).isCloseTo(0.995, within(1e-6));
  }

  @Test
  void wavesMuchShorterThanTheStringAverageOut() {
    assertThat(new MassRipple(0.015, 0.02, 1).factor(LENGTH, 1)).isCloseTo(1, within(1e-5));
  }

  /** Circular frequency of the lowest mode for a wave speed of 1, beads at the middles of steps. */
  private static double lowest(MassRipple ripple) {
    int beads = 300;
    double step = LENGTH / (beads + 1);
    double[] rootMass = new double[beads];
    for (int i = 0; i < beads; i++) {
      double z = (i + 1) * step;
      rootMass[i] =
          Math.sqrt(
              1 + ripple.share() * Math.sin(2 * Math.PI * z / ripple.wave() + ripple.phase()));
    }
    RealMatrix chain = MatrixUtils.createRealMatrix(beads, beads);
    for (int i = 0; i < beads; i++) {
      chain.setEntry(i, i, 2 / (step * step * rootMass[i] * rootMass[i]));
      if (i > 0) {
        double beside = -1 / (step * step * rootMass[i] * rootMass[i - 1]);
        chain.setEntry(i, i - 1, beside);
        chain.setEntry(i - 1, i, beside);
      }
    }
    double[] squares = new EigenDecompositionSymmetric(chain).getEigenvalues();
    return Math.sqrt(squares[squares.length - 1]);
  }
}
