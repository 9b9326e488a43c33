package sillet.acoustics.wire;

import org.jspecify.annotations.Nullable;

/**
 * What is known of a string from its packet or from measuring it.
 *
 * @param diameter outer diameter in m, above zero; the tables behind the estimates cover 0.2 to 3.5
 *     mm
 * @param construction how it is built
 * @param coreShape cross-section of the core of a wound string; of no effect on a plain one
 * @param core thickness of the core in m, null = not known. Below the diameter where the string is
 *     wound (with the corners of a hexagon inside it, too), equal to it where it is plain
 * @param unitMass in kg/m, above zero, null = not known
 */
public record StringSpec(
    double diameter,
    Construction construction,
    CoreShape coreShape,
    @Nullable Double core,
    @Nullable Double unitMass) {

  /** Refuses, as the caller's bug, what no string can have. */
  public StringSpec {
    requirePositive("diameter", diameter);
    if (unitMass != null) {
      requirePositive("unit mass", unitMass);
    }
    if (core != null) {
      requirePositive("core", core);
      requireCoreFits(core, diameter, construction.wound(), coreShape);
    }
  }

  /** A string of which nothing but diameter and construction is known. */
  public static StringSpec of(double diameter, Construction construction) {
    return new StringSpec(diameter, construction, CoreShape.ROUND, null, null);
  }

  /** The same string with a core known. */
  public StringSpec withCore(CoreShape shape, double thickness) {
    return new StringSpec(diameter, construction, shape, thickness, unitMass);
  }

  /** The same string with its unit mass known. */
  public StringSpec withUnitMass(double kilogramsPerMetre) {
    return new StringSpec(diameter, construction, coreShape, core, kilogramsPerMetre);
  }

  private static void requireCoreFits(
      double core, double diameter, boolean wound, CoreShape shape) {
    boolean fits = wound ? shape.windingSeat(core) < diameter : core == diameter;
    if (!fits) {
      throw new IllegalArgumentException("core " + core + " does not fit diameter " + diameter);
    }
  }

  private static void requirePositive(String what, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must be above zero, is " + value);
    }
  }
}
