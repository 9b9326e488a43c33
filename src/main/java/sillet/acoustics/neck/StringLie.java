package sillet.acoustics.neck;

import sillet.acoustics.stiff.EndCondition;
import sillet.acoustics.wire.StringConstants;

/**
 * One string as it lies over its neck, tuned to its pitch.
 *
 * @param constants of the string
 * @param openHz pitch of the open string, above zero; the string is always retuned to it
 * @param scale nominal scale in m (twice nut to fret 12), above zero
 * @param saddleSetback from the nominal place of the saddle, + away from the neck, in m
 * @param nutSetback from the nominal place of the nut, + away from the bridge, in m
 * @param clearances over the frets
 * @param ends how the string is held
 */
public record StringLie(
    StringConstants constants,
    double openHz,
    double scale,
    double saddleSetback,
    double nutSetback,
    Clearances clearances,
    EndCondition ends) {

  /** Refuses, as the caller's bug, what is not finite or not above zero where it must be. */
  public StringLie {
    requirePositive("pitch", openHz);
    requirePositive("scale", scale);
    if (!Double.isFinite(saddleSetback) || !Double.isFinite(nutSetback)) {
      throw new IllegalArgumentException("setbacks must be finite");
    }
  }

  /** A string at its nominal places, held as usual. */
  public static StringLie nominal(
      StringConstants constants, double openHz, double scale, Clearances clearances) {
    return new StringLie(constants, openHz, scale, 0, 0, clearances, EndCondition.USUAL);
  }

  /** The same string with its saddle elsewhere. */
  public StringLie withSaddleSetback(double setback) {
    return new StringLie(constants, openHz, scale, setback, nutSetback, clearances, ends);
  }

  /** The same string with its nut elsewhere. */
  public StringLie withNutSetback(double setback) {
    return new StringLie(constants, openHz, scale, saddleSetback, setback, clearances, ends);
  }

  /** The same lie with another string in it. */
  public StringLie withConstants(StringConstants other) {
    return new StringLie(other, openHz, scale, saddleSetback, nutSetback, clearances, ends);
  }

  /** The same string at other heights. */
  public StringLie withClearances(Clearances other) {
    return new StringLie(constants, openHz, scale, saddleSetback, nutSetback, other, ends);
  }

  private static void requirePositive(String what, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must be above zero, is " + value);
    }
  }
}
