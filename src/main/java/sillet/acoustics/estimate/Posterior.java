package sillet.acoustics.estimate;

import java.util.List;

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
    int first = firstTouched(slopes);
    for (int i = first; i < slopes.length; i++) {
      double[] row = lower[i];
      double sum = slopes[i];
      for (int j = first; j < i; j++) {
        sum -= row[j] * solved[j];
      }
      solved[i] = sum / row[i];
      variance += solved[i] * solved[i];
    }
    return variance;
  }

  private static int firstTouched(double[] slopes) {
    int first = 0;
    while (first < slopes.length && slopes[first] == 0) {
      first++;
    }
    return first;
  }

  /** {@link #variance} of many sums at once, which is faster: a row of slopes each. */
  double[] variances(List<double[]> slopes) {
    int count = slopes.size();
    double[] variances = new double[count];
    double[][] solved = new double[lower.length][count];
    for (int i = 0; i < lower.length; i++) {
      double[] here = solved[i];
      for (int k = 0; k < count; k++) {
        here[k] = slopes.get(k)[i];
      }
      for (int j = 0; j < i; j++) {
        take(lower[i][j], solved[j], here);
      }
      for (int k = 0; k < count; k++) {
        here[k] /= lower[i][i];
        variances[k] += here[k] * here[k];
      }
    }
    return variances;
  }

  private static void take(double times, double[] from, double[] into) {
    if (times != 0) {
      for (int k = 0; k < into.length; k++) {
        into[k] -= times * from[k];
      }
    }
  }
}
