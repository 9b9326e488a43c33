package sillet.acoustics.stiff;

/**
 * Modes of a stiff string, one formula for all ends.
 *
 * <p>delta = sqrt(EI / T), Le = L - alpha delta, f_q = (q / (2 Le)) sqrt(T / mu) sqrt(1 + (q pi
 * delta / Le)^2), where alpha counts the clamped ends (0 to 2). Exact for alpha = 0; for 1 and 2 it
 * equals, to second order in delta / L, the series of P. M. Morse, Vibration and Sound, and of M.
 * B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024).
 *
 * <p>Tolerance, against the exact modes of {@link ExactModes} for q = 1: 0.002 cents (alpha 1) and
 * 0.004 (alpha 2) at delta / L = 0.005, 0.04 at 0.01; strings of a guitar have 0.001 to 0.005.
 * Edge: a string whose ends take all of its length (Le not above zero), or with no tension, gives
 * NaN.
 */
public final class StiffString {

  private StiffString() {}

  /** Bending length delta = sqrt(EI / T) in m; NaN unless the tension is above zero. */
  public static double bendingLength(double bendingStiffness, double tension) {
    return tension > 0 ? Math.sqrt(bendingStiffness / tension) : Double.NaN;
  }

  /**
   * Frequency of mode {@code q} in Hz, or NaN (see above).
   *
   * @param q mode, 1 = fundamental
   * @param length between the ends in m
   * @param tension in N
   * @param unitMass in kg/m, above zero
   * @param delta bending length in m
   * @param alpha clamped ends, 0 to 2
   */
  public static double hz(
      int q, double length, double tension, double unitMass, double delta, double alpha) {
    if (q < 1) {
      throw new IllegalArgumentException("modes count from 1, not " + q);
    }
    double effective = length - alpha * delta;
    if (!(effective > 0 && tension > 0)) {
      return Double.NaN;
    }
    double bend = q * Math.PI * delta / effective;
    return q / (2 * effective) * Math.sqrt(tension / unitMass * (1 + bend * bend));
  }
}
