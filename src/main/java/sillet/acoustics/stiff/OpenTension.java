package sillet.acoustics.stiff;

import sillet.acoustics.solve.Outcome;
import sillet.acoustics.wire.StringConstants;

/**
 * The tension that brings an open string to its pitch.
 *
 * <p>Fixed point of {@link StiffString}'s formula for q = 1: T = mu (2 Le f)^2 / (1 + (pi delta /
 * Le)^2), delta = sqrt(EI / T), Le = L - alpha delta, started at the tension of a string without
 * stiffness. Converges to 1e-13 of itself in under ten steps for strings as they are played; capped
 * at {@value #MAX_STEPS}. Edge: a string so thick, slack or short that bending rules it does not
 * settle and is not solved.
 */
public final class OpenTension {

  private static final int MAX_STEPS = 100;
  private static final double TOLERANCE = 1e-13;

  private OpenTension() {}

  /**
   * Tension in N of the open string.
   *
   * @param constants of the string
   * @param length between nut and saddle in m, finite and above zero
   * @param hz pitch of the open string, finite and above zero
   * @param ends how it is held
   * @throws IllegalArgumentException where length or pitch is out of range
   */
  public static Outcome<Double> of(
      StringConstants constants, double length, double hz, EndCondition ends) {
    requirePositive("length", length);
    requirePositive("pitch", hz);
    double tension = constants.unitMass() * square(2 * length * hz);
    for (int step = 0; step < MAX_STEPS; step++) {
      double next = improve(tension, constants, length, hz, ends.open());
      if (!(next > 0) || Double.isInfinite(next)) {
        break;
      }
      if (Math.abs(next - tension) <= TOLERANCE * next) {
        return Outcome.solved(next);
      }
      tension = next;
    }
    return Outcome.notSolved("no tension brings so stiff a string to this pitch at this length");
  }

  private static double improve(
      double tension, StringConstants constants, double length, double hz, double alpha) {
    double delta = Math.sqrt(constants.bendingStiffness() / tension);
    double effective = length - alpha * delta;
    if (!(effective > 0)) {
      return Double.NaN;
    }
    return constants.unitMass()
        * square(2 * effective * hz)
        / (1 + square(Math.PI * delta / effective));
  }

  private static double square(double x) {
    return x * x;
  }

  private static void requirePositive(String what, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must be above zero, is " + value);
    }
  }
}
