package sillet.acoustics.virtual;

/**
 * What holds a string at one end.
 *
 * @param clamp 0 lets the string turn freely, 1 holds its direction; between them a rotation spring
 *     as stiff as the string's own end, EI clamp/((1 - clamp) sqrt(EI/T))
 * @param give how far the end yields sideways
 */
record StringEnd(double clamp, Give give) {
  /** Sideways yield of an end at one frequency. */
  @FunctionalInterface
  interface Give {
    /** Metres per newton, in phase with the force; may be negative above a resonance. */
    double at(double omega);
  }

  /** An end that does not yield. */
  static StringEnd firm(double clamp) {
    return new StringEnd(clamp, omega -> 0);
  }
}
