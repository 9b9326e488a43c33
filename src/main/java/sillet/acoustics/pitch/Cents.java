package sillet.acoustics.pitch;

/**
 * The cent: 1200 log2 of a ratio of frequencies; positive = sharp.
 *
 * <p>Source: A. J. Ellis (1885), from memory; the formula and its linear form as M. B. Anderson, R.
 * G. Beausoleil, "Classical guitar intonation and compensation: The well-tempered guitar", J.
 * Acoust. Soc. Am. 156(1), 683 (2024) use them.
 */
public final class Cents {

  /** Cents in one octave. */
  public static final double OCTAVE = 1200;

  /** Cents for a small share: 1200 / ln 2 = 1731.234, the C of the formulas. */
  public static final double PER_UNIT = OCTAVE / Math.log(2);

  private Cents() {}

  /** How many cents {@code hz} lies above {@code referenceHz}; NaN unless both are above zero. */
  public static double between(double referenceHz, double hz) {
    return ofRatio(hz / referenceHz);
  }

  /** 1200 log2 of a ratio; NaN below zero, minus infinity at zero. */
  public static double ofRatio(double ratio) {
    return PER_UNIT * Math.log(ratio);
  }

  /** The ratio of frequencies that {@code cents} stand for; above zero. */
  public static double toRatio(double cents) {
    return Math.exp(cents / PER_UNIT);
  }

  /**
   * Cents of a small relative change of frequency (or, with the sign turned, of length), to first
   * order: C x. Off by C x^2 / 2: 0.09 cents at x = 0.01.
   */
  public static double ofSmallShare(double share) {
    return PER_UNIT * share;
  }
}
