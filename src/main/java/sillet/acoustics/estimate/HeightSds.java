package sillet.acoustics.estimate;

import sillet.acoustics.wire.Construction;

/**
 * How well the clearances of a string are known, as standard deviations in m, each above zero.
 *
 * @param atTwelve of the gap over fret 12
 * @param atFirst of the gap over fret 1
 * @param relief of the depth of the neck's bow
 */
public record HeightSds(double atTwelve, double atFirst, double relief) {
  private static final HeightSds MEASURED = new HeightSds(8e-5, 2.5e-5, 3e-5);

  private static final HeightSds UNKNOWN_STEEL = new HeightSds(4e-4, 1e-4, 1e-4);

  private static final HeightSds UNKNOWN_SOFT = new HeightSds(5e-4, 1.5e-4, 8e-5);

  /**
   * Refuses what is not above zero.
   *
   * @throws IllegalArgumentException if an sd is not finite and above zero
   */
  public HeightSds {
    requirePositive(atTwelve);
    requirePositive(atFirst);
    requirePositive(relief);
  }

  /** Read with rule, feelers and straightedge: 0.08, 0.025 and 0.03 mm (chosen; no source). */
  public static HeightSds measured() {
    return MEASURED;
  }

  /**
   * Nobody measured, and {@link sillet.acoustics.neck.Clearances#usual} stands in: the spread of
   * instruments as they come to a bench (common practice, no source).
   */
  public static HeightSds unknown(Construction construction) {
    return construction.steel() ? UNKNOWN_STEEL : UNKNOWN_SOFT;
  }

  private static void requirePositive(double sd) {
    if (!(sd > 0) || Double.isInfinite(sd)) {
      throw new IllegalArgumentException("the sd of a height is " + sd);
    }
  }
}
