package sillet.acoustics.forecast;

import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

/**
 * A string and the pitch it is tuned to.
 *
 * @param spec what is known of it
 * @param openHz pitch of the open string in Hz, finite and above zero
 * @param scale nominal scale in m, finite and above zero
 */
public record Stringing(StringSpec spec, double openHz, double scale) {

  /** Refuses, as the caller's bug, a pitch or scale that is not finite and above zero. */
  public Stringing {
    requirePositive("pitch", openHz);
    requirePositive("scale", scale);
  }

  /** Its constants as the packet lets them be estimated. */
  public StringConstants constants() {
    return StringEstimate.of(spec, openHz, scale);
  }

  /** The same place with another string on it. */
  public Stringing with(StringSpec other) {
    return new Stringing(other, openHz, scale);
  }

  /** The same string tuned to another pitch in Hz. */
  public Stringing tunedTo(double hz) {
    return new Stringing(spec, hz, scale);
  }

  /** The same string so many semitones higher; below zero is lower. */
  public Stringing tunedBy(int semitones) {
    return tunedTo(openHz * EqualTemperament.ratio(semitones));
  }

  /**
   * The same note under another reference pitch.
   *
   * @param fromA4 reference in Hz that the pitch is meant under, above zero; usually {@link
   *     EqualTemperament#STANDARD_A4}
   * @param toA4 the other reference in Hz, above zero
   */
  public Stringing atReference(double fromA4, double toA4) {
    requirePositive("reference pitch", fromA4);
    requirePositive("reference pitch", toA4);
    return tunedTo(openHz * toA4 / fromA4);
  }

  private static void requirePositive(String what, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must be above zero, is " + value);
    }
  }
}
