package sillet.acoustics.findings;

import java.util.Arrays;

/**
 * Readings as a linear problem about the most likely lie: misfit = slopes x unknowns + noise, the
 * unknowns independent with mean 0 and standard deviation 1, the noise of each row independent.
 *
 * <p>Answers what a further cause of known shape amounts to while everything unknown adjusts
 * itself: generalised least squares with S = noise + slopes slopes', its inverse by the Woodbury
 * identity, so that only a matrix of the size of the unknowns is factored, once.
 */
final class LinearNeck {
  /** Standard deviation of an amount of which nothing is known beforehand, m or cents. */
  private static final double FREE = 10;

  private final double[] misfit;
  private final double[] sd;
  private final double[][] slopes;
  private final double[][] factor;
  private final double[] pull;

  /**
   * A problem.
   *
   * @param misfit row by row: what was read minus what is expected, cents (m for a height)
   * @param sd of the noise, row by row, same unit, above zero
   * @param slopes row by row, by unknown, same unit
   */
  LinearNeck(double[] misfit, double[] sd, double[][] slopes) {
    this.misfit = misfit;
    this.sd = sd;
    this.slopes = slopes;
    this.factor = factor();
    this.pull = pull();
  }

  int rows() {
    return misfit.length;
  }

  double sd(int row) {
    return sd[row];
  }

  /** The same with one more cause, of which nothing is known beforehand. */
  LinearNeck with(double[] shape) {
    double[][] more = new double[rows()][];
    for (int i = 0; i < more.length; i++) {
      int unknowns = slopes[i].length;
      more[i] = Arrays.copyOf(slopes[i], unknowns + 1);
      more[i][unknowns] = FREE * shape[i];
    }
    return new LinearNeck(misfit, sd, more);
  }

  /** The same with other noise. */
  LinearNeck withSd(double[] other) {
    return new LinearNeck(misfit, other, slopes);
  }

  /** A cause's shape over the rows, prepared: its score and what it shares with the unknowns. */
  Trace trace(double[] shape) {
    double[] shared = new double[factor.length];
    double own = 0;
    double score = 0;
    for (int i = 0; i < shape.length; i++) {
      if (shape[i] != 0) {
        double weighed = shape[i] / (sd[i] * sd[i]);
        own += weighed * shape[i];
        score += pull[i] * shape[i];
        for (int k = 0; k < shared.length; k++) {
          shared[k] += slopes[i][k] * weighed;
        }
      }
    }
    forward(shared);
    return new Trace(shape, shared, score, own - dot(shared, shared));
  }

  /** How much of a cause of this shape there is beyond what is expected. */
  Amount amount(double[] shape) {
    return trace(shape).amount();
  }

  /** What one trace tells of another: the off-diagonal term of their information. */
  double common(Trace one, Trace other) {
    double sum = -dot(one.shared, other.shared);
    for (int i = 0; i < one.shape.length; i++) {
      if (one.shape[i] != 0) {
        sum += one.shape[i] * other.shape[i] / (sd[i] * sd[i]);
      }
    }
    return sum;
  }

  /** A row left out: by how much it lies off what all the others say of it, cents. */
  Amount alone(int row) {
    double[] shared = new double[factor.length];
    double weight = 1 / (sd[row] * sd[row]);
    for (int k = 0; k < shared.length; k++) {
      shared[k] = slopes[row][k] * weight;
    }
    forward(shared);
    double information = weight - dot(shared, shared);
    return new Amount(pull[row] / information, 1 / Math.sqrt(information));
  }

  /** The unknowns' most likely values, in their standard deviations. */
  double[] likely() {
    double[] likely = new double[factor.length];
    for (int i = 0; i < rows(); i++) {
      for (int k = 0; k < likely.length; k++) {
        likely[k] += slopes[i][k] * pull[i];
      }
    }
    return likely;
  }

  /** What is left of a row at the most likely point, in its own unit. */
  double residual(int row) {
    return pull[row] * sd[row] * sd[row];
  }

  /** S^-1 misfit. */
  private double[] pull() {
    double[] inside = new double[factor.length];
    for (int i = 0; i < rows(); i++) {
      double weighed = misfit[i] / (sd[i] * sd[i]);
      for (int k = 0; k < inside.length; k++) {
        inside[k] += slopes[i][k] * weighed;
      }
    }
    forward(inside);
    backward(inside);
    double[] weighed = new double[rows()];
    for (int i = 0; i < weighed.length; i++) {
      weighed[i] = (misfit[i] - dot(slopes[i], inside)) / (sd[i] * sd[i]);
    }
    return weighed;
  }

  /** Lower triangle of 1 + slopes' noise^-1 slopes. */
  private double[][] factor() {
    int size = slopes.length == 0 ? 0 : slopes[0].length;
    double[][] information = new double[size][size];
    for (int i = 0; i < rows(); i++) {
      double weight = 1 / (sd[i] * sd[i]);
      for (int k = 0; k < size; k++) {
        double weighed = slopes[i][k] * weight;
        if (weighed != 0) {
          for (int l = 0; l <= k; l++) {
            information[k][l] += weighed * slopes[i][l];
          }
        }
      }
    }
    for (int k = 0; k < size; k++) {
      information[k][k] += 1;
    }
    return rooted(information);
  }

  /** Cholesky's factor in the place of the lower triangle; 1 on the diagonal keeps it definite. */
  private static double[][] rooted(double[][] lower) {
    for (int i = 0; i < lower.length; i++) {
      double[] row = lower[i];
      for (int j = 0; j <= i; j++) {
        double[] other = lower[j];
        double sum = row[j];
        for (int k = 0; k < j; k++) {
          sum -= row[k] * other[k];
        }
        row[j] = i == j ? Math.sqrt(sum) : sum / other[j];
      }
    }
    return lower;
  }

  private void forward(double[] x) {
    for (int i = 0; i < x.length; i++) {
      double[] row = factor[i];
      double sum = x[i];
      for (int j = 0; j < i; j++) {
        sum -= row[j] * x[j];
      }
      x[i] = sum / row[i];
    }
  }

  private void backward(double[] x) {
    for (int i = x.length - 1; i >= 0; i--) {
      x[i] /= factor[i][i];
      for (int j = 0; j < i; j++) {
        x[j] -= factor[i][j] * x[i];
      }
    }
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }

  /** See {@link #trace}; {@code information} is 1 / variance of the amount. */
  static final class Trace {
    private final double[] shape;
    private final double[] shared;
    private final double score;
    private final double information;

    Trace(double[] shape, double[] shared, double score, double information) {
      this.shape = shape;
      this.shared = shared;
      this.score = score;
      this.information = information;
    }

    double score() {
      return score;
    }

    double information() {
      return information;
    }

    Amount amount() {
      return new Amount(score / information, 1 / Math.sqrt(information));
    }
  }

  /** An amount of a cause and its sd; {@code gain} is what the cause takes off chi-square. */
  record Amount(double value, double sd) {
    double gain() {
      return value * value / (sd * sd);
    }

    double significance() {
      return Math.abs(value) / sd;
    }
  }
}
