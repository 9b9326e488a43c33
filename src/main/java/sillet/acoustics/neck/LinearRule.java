package sillet.acoustics.neck;

import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;

/**
 * The rule of lengths alone: what a move of saddle or nut does to the cents of a fretted note
 * against the retuned open string, to first order.
 *
 * <p>Saddle: -C (gamma - 1) / X0 per metre away from the neck, at fret 12 -C / X0. Nut: C / X0 per
 * metre of setback, the same at every fret. Derived from L_n = X0 / gamma + s. {@link FrettedPitch}
 * gives 0.1 % (plain .010 in) to 2 % (plain .017 in) more per metre at fret 12, because the longer
 * string is retuned with more tension and then stretches and bends less; so the rule asks for moves
 * that much too large.
 */
public final class LinearRule {

  private LinearRule() {}

  /**
   * Cents per metre of saddle move away from the neck; below zero.
   *
   * @param scale nominal scale in m, above zero
   * @param fret from 1
   * @throws IllegalArgumentException where a parameter is out of range
   */
  public static double centsPerMetre(double scale, int fret) {
    if (!(scale > 0) || Double.isInfinite(scale)) {
      throw new IllegalArgumentException("scale must be above zero, is " + scale);
    }
    if (fret < 1) {
      throw new IllegalArgumentException("the saddle moves no open string: fret " + fret);
    }
    return -Cents.PER_UNIT * (EqualTemperament.ratio(fret) - 1) / scale;
  }

  /** Saddle move in m, + away from the neck, that takes {@code cents} away at a fret. */
  public static double saddleMove(double cents, double scale, int fret) {
    return -cents / centsPerMetre(scale, fret);
  }

  /** Nut move in m, + toward the bridge, that takes {@code cents} away at every fret. */
  public static double nutMove(double cents, double scale) {
    return cents * scale / Cents.PER_UNIT;
  }
}
