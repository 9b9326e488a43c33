package sillet.acoustics.pitch;

/**
 * Where the frets of an equal-tempered board stand.
 *
 * <p>Fret n stands X0 2^(-n/12) from the uncompensated saddle, X0 the nominal scale (twice nut to
 * fret 12). Each fret takes one 17.817th of what is left, 1 / (1 - 2^(-1/12)) = 17.81715. Source of
 * rule and divisor: G. Byers, "Classical Guitar Intonation", American Lutherie 47 (1996).
 */
public final class FretPositions {

  /** The fret divisor, 17.81715. */
  public static final double DIVISOR = 1 / (1 - Math.pow(2, -1.0 / EqualTemperament.SEMITONES));

  private FretPositions() {}

  /**
   * Distance from fret {@code fret} to the uncompensated saddle.
   *
   * @param scale nominal scale, above zero
   * @param fret 0 for the nut, at most 48
   * @throws IllegalArgumentException where a parameter is out of range
   */
  public static double toSaddle(double scale, int fret) {
    requireScale(scale);
    requireFret(fret);
    return scale / EqualTemperament.ratio(fret);
  }

  /** Distance from the uncompensated nut to fret {@code fret}; as {@link #toSaddle}. */
  public static double fromNut(double scale, int fret) {
    return scale - toSaddle(scale, fret);
  }

  /** Highest fret that any formula here is asked for. */
  public static final int HIGHEST = 48;

  /** Refuses a fret below 0 or above {@link #HIGHEST} as the caller's bug. */
  public static void requireFret(int fret) {
    if (fret < 0 || fret > HIGHEST) {
      throw new IllegalArgumentException("no such fret: " + fret);
    }
  }

  private static void requireScale(double scale) {
    if (!(scale > 0) || Double.isInfinite(scale)) {
      throw new IllegalArgumentException("scale must be above zero, is " + scale);
    }
  }
}
