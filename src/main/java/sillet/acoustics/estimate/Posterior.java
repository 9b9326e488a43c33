package sillet.acoustics.estimate;

/** Where the least-squares step leads, and how sure any linear figure of the unknowns is. */
final class Posterior {
  private final double[][] lower;
  private final double[] step;

  /**
   * A posterior.
   *
   * @param lower Cholesky factor of the inverse covariance
   * @param step to the most likely point
   */
  Posterior(double[][] lower, double[] step) {
    this.lower = lower;
    this.step = step;
  }

  double[] step() {
    return step.clone();
  }

  /** Variance of the sum of slope times unknown. */
  double variance(double[] slopes) {
    double variance = 0;
    double[] solved = new double[slopes.length];
    for (int i = 0; i < slopes.length; i++) {
      double[] row = lower[i];
      double sum = slopes[i];
      for (int j = 0; j < i; j++) {
        sum -= row[j] * solved[j];
      }
      solved[i] = sum / row[i];
      variance += solved[i] * solved[i];
    }
    return variance;
  }
}
