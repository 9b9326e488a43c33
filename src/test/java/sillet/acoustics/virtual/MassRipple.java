package sillet.acoustics.virtual;

/**
 * Unit mass that swings along the string: 1 + share sin(2 pi z / wave + phase), z from the saddle.
 *
 * @param share greatest deviation, 0 = an even string
 * @param wave length of one swing, metres
 * @param phase at the saddle
 */
record MassRipple(double share, double wave, double phase) {
  static final MassRipple NONE = new MassRipple(0, 1, 0);

  /**
   * Factor on the frequency of a mode of the sounding length next to the saddle, by first-order
   * perturbation: 1 - e/2, e the deviation averaged with the square of the mode's shape, 2 sin^2(q
   * pi z / L) / L.
   */
  double factor(double length, int mode) {
    if (share == 0) {
      return 1;
    }
    double swing = 2 * Math.PI / wave;
    double shape = 2 * Math.PI * mode / length;
    // 2 sin^2 = 1 - cos(shape z), and sin a cos b = (sin(a + b) + sin(a - b)) / 2
    double mean =
        meanSine(swing, length)
            - 0.5 * (meanSine(swing + shape, length) + meanSine(swing - shape, length));
    return 1 - 0.5 * share * mean;
  }

  /** Mean of sin(k z + phase) over 0 to L. */
  private double meanSine(double k, double length) {
    double turn = k * length;
    if (Math.abs(turn) < 1e-6) {
      return Math.sin(phase);
    }
    return (Math.cos(phase) - Math.cos(turn + phase)) / turn;
  }
}
