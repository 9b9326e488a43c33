package sillet.acoustics.virtual;

/**
 * Other strings for an instrument.
 *
 * @param gaugeFactor on every gauge of the set
 * @param semitonesLower how much lower it is tuned
 * @param higherAtTwelve how much higher the strings come to lie over fret 12, metres
 * @param sameMake whether the new set is of the make of the old one
 */
public record SetChange(
    double gaugeFactor, int semitonesLower, double higherAtTwelve, boolean sameMake) {
  /**
   * Gauges by 5 to 12 % either way, 0 to 4 semitones lower, the action 0.3 mm down to 0.6 mm up;
   * half the shops stay with the make.
   */
  public static SetChange draw(Luck luck) {
    double gauges = luck.between(0.05, 0.12) * (luck.chance(0.5) ? 1 : -1);
    return new SetChange(
        1 + gauges, (int) luck.between(0, 5), luck.between(-3e-4, 6e-4), luck.chance(0.5));
  }
}
