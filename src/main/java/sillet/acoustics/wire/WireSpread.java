package sillet.acoustics.wire;

/**
 * How far a string may be from its {@link StringConstants}: standard deviations of natural
 * logarithms (0.03 = 3 %), independent of each other, each finite and not negative.
 *
 * @param core of the thickness that carries the tension: axial stiffness goes with its square,
 *     bending stiffness with its fourth power
 * @param modulus of Young's modulus and whatever else moves both stiffnesses alike
 * @param bending of the bending stiffness alone
 * @param mass of the unit mass
 */
public record WireSpread(double core, double modulus, double bending, double mass) {
  private static final double ONE_MODULUS_AT_MOST = 0.05;
  private static final double USUAL_MASS = 0.01;

  /** Refuses, as the caller's bug, what is not finite or negative. */
  public WireSpread {
    for (double sd : new double[] {core, modulus, bending, mass}) {
      if (!(sd >= 0) || Double.isInfinite(sd)) {
        throw new IllegalArgumentException("a spread must not be negative, is " + sd);
      }
    }
  }

  /**
   * What a spread of the axial stiffness alone stands for: up to 5 % the modulus, beyond that a
   * core nobody measured.
   */
  public static WireSpread ofAxial(double relativeSd) {
    return relativeSd <= ONE_MODULUS_AT_MOST
        ? new WireSpread(0, relativeSd, 0, USUAL_MASS)
        : new WireSpread(relativeSd / 2, 0, 0, USUAL_MASS);
  }
}
