package sillet.acoustics.wire;

import java.util.OptionalDouble;

/**
 * Breaking tension of steel strings.
 *
 * <p>Tensile strength of music wire by diameter d in mm, in MPa, as quoted by public transcriptions
 * of each source: 2211 / d^0.145 (J. E. Shigley, Mechanical Engineering Design, table 10-4, ASTM
 * A228; stated range 0.10 to 6.5 mm); 2220 - 820 lg d, at most 2660 (EN 10270-1, grade SH); 2218 -
 * 817 lg d, at most 2800 (grade DH). All are minimum figures of straight wire: a kink, a sharp
 * saddle or rust takes from them.
 *
 * <p>A wound string hangs on its core alone. For nylon, fluorocarbon and gut no figure was found
 * that is sound enough to print, so there is none.
 */
public final class WireStrength {

  private static final double MEGA = 1e6;
  private static final double MILLI = 1e-3;

  private WireStrength() {}

  /** Tensile strength in Pa after Shigley for a wire of {@code diameter} in m, above zero. */
  public static double shigley(double diameter) {
    return MEGA * 2211 / Math.pow(millimetres(diameter), 0.145);
  }

  /** Tensile strength in Pa after EN 10270-1, grade SH. */
  public static double enStatic(double diameter) {
    return MEGA * Math.min(2660, 2220 - 820 * Math.log10(millimetres(diameter)));
  }

  /** Tensile strength in Pa after EN 10270-1, grade DH. */
  public static double enDynamic(double diameter) {
    return MEGA * Math.min(2800, 2218 - 817 * Math.log10(millimetres(diameter)));
  }

  /**
   * Breaking tension in N of a plain steel string, or of a wound one whose core is known; else
   * empty.
   */
  public static OptionalDouble breakingTension(StringSpec spec) {
    if (!spec.construction().steel()) {
      return OptionalDouble.empty();
    }
    if (!spec.construction().wound()) {
      return OptionalDouble.of(tension(spec.diameter(), CoreShape.ROUND));
    }
    Double core = spec.core();
    return core == null
        ? OptionalDouble.empty()
        : OptionalDouble.of(tension(core, spec.coreShape()));
  }

  /** As {@link #breakingTension(StringSpec)}, with an unknown core taken from {@link CoreShare}. */
  public static OptionalDouble breakingTension(StringSpec spec, double scale) {
    boolean guess = spec.construction().wound() && spec.core() == null;
    if (!guess || !spec.construction().steel()) {
      return breakingTension(spec);
    }
    double core = CoreShare.usual(spec.diameter(), scale).share() * spec.diameter();
    return OptionalDouble.of(tension(core, spec.coreShape()));
  }

  /** Share of its breaking tension that a string of {@code scale} carries at {@code tension} N. */
  public static OptionalDouble shareOfBreaking(StringSpec spec, double scale, double tension) {
    OptionalDouble breaking = breakingTension(spec, scale);
    return breaking.isPresent()
        ? OptionalDouble.of(tension / breaking.getAsDouble())
        : OptionalDouble.empty();
  }

  private static double tension(double thickness, CoreShape shape) {
    return shigley(thickness) * shape.area(thickness);
  }

  private static double millimetres(double diameter) {
    if (!(diameter > 0) || Double.isInfinite(diameter)) {
      throw new IllegalArgumentException("diameter must be above zero, is " + diameter);
    }
    return diameter / MILLI;
  }
}
