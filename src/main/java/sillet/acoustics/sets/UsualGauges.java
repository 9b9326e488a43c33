package sillet.acoustics.sets;

import java.util.Arrays;
import sillet.acoustics.wire.Construction;

/**
 * Gauges that strings are usually sold in, by construction. Common practice, no source: the steps
 * of the trade are no standard, and a shop's dealer may have others.
 */
public final class UsualGauges {

  /** A thousandth of an inch in m. */
  private static final double THOU = 25.4e-6;

  private static final double[] PLAIN_STEEL = {
    7, 8, 8.5, 9, 9.5, 10, 10.5, 11, 11.5, 12, 12.5, 13, 13.5, 14, 15, 16, 17, 18, 19, 20, 21, 22,
    24, 26
  };
  private static final double[] WOUND = {
    17, 18, 19, 20, 21, 22, 23, 24, 25, 26, 28, 30, 32, 34, 36, 38, 40, 42, 44, 46, 48, 49, 50, 52,
    54, 56, 58, 60, 62, 64, 66, 68, 70, 72, 74, 76, 80, 84, 85, 90, 95, 100, 105, 110, 115, 120,
    125, 130, 135, 140, 145, 150
  };
  private static final double[] MONOFILAMENT = {
    18, 19, 20, 21, 22, 23, 24, 25, 26, 27, 28, 29, 30, 31, 32, 33, 34, 35, 36, 37, 38, 39, 40, 41,
    42, 43, 44
  };

  private UsualGauges() {}

  /**
   * The diameters in m, thinnest first.
   *
   * @param construction how the string is made; wound nylon has none, since its core is a bundle
   *     that no geometry describes
   */
  public static double[] of(Construction construction) {
    double[] thousandths =
        switch (construction) {
          case PLAIN_STEEL -> PLAIN_STEEL;
          case WOUND_STEEL, WOUND_NICKEL, WOUND_BRONZE -> WOUND;
          case PLAIN_NYLON, PLAIN_FLUOROCARBON, PLAIN_GUT -> MONOFILAMENT;
          case WOUND_NYLON -> new double[0];
        };
    return Arrays.stream(thousandths).map(thou -> thou * THOU).toArray();
  }
}
