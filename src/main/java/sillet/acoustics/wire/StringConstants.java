package sillet.acoustics.wire;

/**
 * The three numbers that the pitch of a string depends on, beside its length and tension.
 *
 * @param unitMass mass per length in kg/m, above zero
 * @param axialStiffness EA in N, not negative: force for a stretch of its own length
 * @param bendingStiffness EI in N m2, not negative
 * @param relativeSd standard deviation of the axial stiffness as a share of it (0.03 = 3 %); that
 *     of the bending stiffness is about double where a core was estimated, since it goes with the
 *     fourth power of the thickness
 * @param spread the same in its parts
 */
public record StringConstants(
    double unitMass,
    double axialStiffness,
    double bendingStiffness,
    double relativeSd,
    WireSpread spread) {

  /** Refuses, as the caller's bug, what is not finite or has the wrong sign. */
  public StringConstants {
    if (!(unitMass > 0) || Double.isInfinite(unitMass)) {
      throw new IllegalArgumentException("unit mass must be above zero, is " + unitMass);
    }
    requireNotNegative("axial stiffness", axialStiffness);
    requireNotNegative("bending stiffness", bendingStiffness);
    requireNotNegative("relative sd", relativeSd);
  }

  /** A string whose spread is that of {@link WireSpread#ofAxial}. */
  public StringConstants(
      double unitMass, double axialStiffness, double bendingStiffness, double relativeSd) {
    this(
        unitMass,
        axialStiffness,
        bendingStiffness,
        relativeSd,
        WireSpread.ofAxial(relativeSd >= 0 ? relativeSd : 0));
  }

  /** The same string with its axial stiffness taken times {@code factor}; bending unchanged. */
  public StringConstants stretchedBy(double factor) {
    return new StringConstants(
        unitMass, axialStiffness * factor, bendingStiffness, relativeSd, spread);
  }

  private static void requireNotNegative(String what, double value) {
    if (!(value >= 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must not be negative, is " + value);
    }
  }
}
