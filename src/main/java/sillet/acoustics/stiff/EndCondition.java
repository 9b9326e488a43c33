package sillet.acoustics.stiff;

/**
 * How firmly each end of the string is held: 0 = pinned (free to turn), 1 = clamped. Each clamped
 * end takes one bending length delta off the sounding length.
 *
 * <p>Measured sum on plain nylon at fret 12 of five guitars: 1.1 +- 0.2 (M. B. Anderson, R. G.
 * Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024)); both ends clamped (P. M. Morse, Vibration
 * and Sound) is 2. No measurement on steel was found, so that this stays a setting.
 *
 * @param saddle at the saddle, 0 to 1
 * @param nut at the nut, 0 to 1; counts for the open string
 * @param fret at a fret, 0 to 1; counts for fretted notes
 */
public record EndCondition(double saddle, double nut, double fret) {

  /** Pinned at the saddle, clamped at nut and fret: the default. */
  public static final EndCondition USUAL = new EndCondition(0, 1, 1);

  /** Free to turn at every end. */
  public static final EndCondition PINNED = new EndCondition(0, 0, 0);

  /** Clamped at every end. */
  public static final EndCondition CLAMPED = new EndCondition(1, 1, 1);

  /** Refuses, as the caller's bug, a share outside 0 to 1. */
  public EndCondition {
    requireShare(saddle);
    requireShare(nut);
    requireShare(fret);
  }

  /** Clamped ends of the open string, 0 to 2: the alpha of the formulas. */
  public double open() {
    return saddle + nut;
  }

  /** Clamped ends of a fretted note, 0 to 2. */
  public double fretted() {
    return saddle + fret;
  }

  private static void requireShare(double share) {
    if (!(share >= 0 && share <= 1)) {
      throw new IllegalArgumentException("an end is held by 0 to 1, not " + share);
    }
  }
}
