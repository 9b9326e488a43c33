package sillet.acoustics.readings;

/**
 * What the tuner said of one fretted note, its tries already taken together.
 *
 * @param fret 1 to {@value #LAST_FRET}
 * @param cents note minus reference, positive when the note is sharp
 * @param sd standard deviation of that difference, cents, above zero: tuner, hand and the rounding
 *     of what was typed
 */
public record FretReading(int fret, double cents, double sd) {
  /** Highest fret a reading may have. */
  public static final int LAST_FRET = 36;

  /**
   * Checks the values.
   *
   * @throws IllegalArgumentException if a value is not finite or out of range
   */
  public FretReading {
    if (fret < 1 || fret > LAST_FRET) {
      throw new IllegalArgumentException("fret " + fret + " is not within 1 to " + LAST_FRET);
    }
    if (!Double.isFinite(cents)) {
      throw new IllegalArgumentException("reading at fret " + fret + " is " + cents + " cents");
    }
    if (!(sd > 0) || Double.isInfinite(sd)) {
      throw new IllegalArgumentException("sd at fret " + fret + " is " + sd + " cents");
    }
  }
}
