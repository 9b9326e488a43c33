package sillet.acoustics.virtual;

/**
 * Other strings for an instrument.
 *
 * @param gaugeFactor on every gauge of the set
 * @param semitonesLower how much lower it is tuned
 * @param higherAtTwelve how much higher the strings come to lie over fret 12, metres
 */
public record SetChange(double gaugeFactor, int semitonesLower, double higherAtTwelve) {
  /**
   * Gauges by an eighth either way, 0 to 4 semitones lower, the action 0.3 mm down to 0.6 mm up.
   */
  public static SetChange draw(Luck luck) {
    return new SetChange(
        luck.between(0.88, 1.12), (int) luck.between(0, 5), luck.between(-3e-4, 6e-4));
  }
}
