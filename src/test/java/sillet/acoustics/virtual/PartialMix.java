package sillet.acoustics.virtual;

/**
 * What is heard of a note: its partials, each counted back to the fundamental, in fixed shares. A
 * tuner that listens to more than the first partial hears a stiff string sharp.
 *
 * @param second share of the second partial in the logarithm of the pitch heard, 0 to 1
 * @param third share of the third
 */
record PartialMix(double second, double third) {
  static final PartialMix FUNDAMENTAL = new PartialMix(0, 0);

  /** Frequency of a mode in hertz. */
  @FunctionalInterface
  interface Modes {
    double hz(int mode);
  }

  /** The pitch heard of a sound whose first partial is a mode of the string: 1, or 2 at fret 12. */
  double heard(Modes modes, int first) {
    double ground = modes.hz(first);
    double log = Math.log(ground);
    double heard = log;
    if (second > 0) {
      heard += second * (Math.log(modes.hz(2 * first) / 2) - log);
    }
    if (third > 0) {
      heard += third * (Math.log(modes.hz(3 * first) / 3) - log);
    }
    return Math.exp(heard);
  }
}
