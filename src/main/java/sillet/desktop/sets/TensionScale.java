package sillet.desktop.sets;

/**
 * The scale that the bars of all strings share, from zero.
 *
 * @param mostN where it ends, a whole number of steps
 * @param stepN from one figure of the scale to the next
 */
record TensionScale(double mostN, double stepN) {
  private static final double[] STEPS = {5, 10, 25, 50, 100, 250, 500, 1000};
  private static final int MOST_STEPS = 6;

  /** A scale that holds a tension; the usual one where there is none. */
  static TensionScale over(double tensionN) {
    double most = Math.max(tensionN, STEPS[0]);
    double step = STEPS[STEPS.length - 1];
    for (int i = STEPS.length - 1; i >= 0; i--) {
      if (Math.ceil(most / STEPS[i]) <= MOST_STEPS) {
        step = STEPS[i];
      }
    }
    return new TensionScale(Math.ceil(most / step) * step, step);
  }

  /** Px from the zero of a scale so wide. */
  double x(double tensionN, double width) {
    return Math.min(1, tensionN / mostN) * width;
  }
}
