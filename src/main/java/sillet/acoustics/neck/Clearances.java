package sillet.acoustics.neck;

import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.wire.Construction;

/**
 * Gaps between the open string and the fret tops, as a gauge reads them (the neck's relief is in
 * the first two already).
 *
 * <p>The frets lie on a straight line with a bow under it: at a fret, clearance = line + bow, bow =
 * 4 relief u (1 - u), u running along the neck from 0 at fret 1 to 1 at the body joint; beyond, no
 * bow. The line is the one through the clearances at frets 1 and 12 less their bow.
 *
 * @param atTwelve clearance over fret 12 in m
 * @param atFirst clearance over fret 1 in m
 * @param relief greatest depth of the bow in m; negative for a back-bow
 */
public record Clearances(double atTwelve, double atFirst, double relief) {

  /** Distance of frets 1 and 12 from the nut, as a share of the scale. */
  private static final double FIRST = 1 - 1 / EqualTemperament.ratio(1);

  private static final double TWELFTH = 0.5;

  /** Steel strings: common practice, no source; middle of the figures for guitars. */
  private static final Clearances USUAL_STEEL = new Clearances(1.75e-3, 0.45e-3, 0.15e-3);

  /** Nylon, fluorocarbon and gut: common practice, no source; a classical guitar. */
  private static final Clearances USUAL_SOFT = new Clearances(3.6e-3, 0.7e-3, 0.05e-3);

  /** Refuses what is not finite as the caller's bug. */
  public Clearances {
    if (!Double.isFinite(atTwelve) || !Double.isFinite(atFirst) || !Double.isFinite(relief)) {
      throw new IllegalArgumentException("clearances must be finite");
    }
  }

  /**
   * What to reckon with where nobody has measured: 1.75 mm over fret 12, 0.45 over fret 1, 0.15
   * relief on steel; 3.6, 0.7, 0.05 on nylon, fluorocarbon and gut (common practice, no source). A
   * saddle move depends on them by less than 1 % of itself.
   */
  public static Clearances usual(Construction construction) {
    return construction.steel() ? USUAL_STEEL : USUAL_SOFT;
  }

  /**
   * Clearances over a straight neck, from heights at its two ends.
   *
   * @param atNut height of the string over the plane of the frets at the nut, in m: the b of the
   *     formulas
   * @param rise how much higher it is at the saddle, in m: c
   */
  public static Clearances overStraightNeck(double atNut, double rise) {
    return new Clearances(atNut + TWELFTH * rise, atNut + FIRST * rise, 0);
  }

  /** Rise c of the string from nut to saddle over the line of the frets, in m. */
  public double rise(int bodyJoint) {
    return (atTwelve - bowAt(12, bodyJoint) - atFirst) / (TWELFTH - FIRST);
  }

  /** Height b of the string over the line of the frets at the nut, in m. */
  public double atNut(int bodyJoint) {
    return atFirst - FIRST * rise(bodyJoint);
  }

  /** Depth of the bow at a fret in m; 0 at fret 1, at the body joint and beyond. */
  public double bowAt(int fret, int bodyJoint) {
    if (relief == 0 || fret <= 1 || fret >= bodyJoint) {
      return 0;
    }
    double along = 1 - 1 / EqualTemperament.ratio(fret) - FIRST;
    double whole = 1 - 1 / EqualTemperament.ratio(bodyJoint) - FIRST;
    double u = along / whole;
    return 4 * relief * u * (1 - u);
  }
}
