package sillet.acoustics.estimate;

import java.util.List;
import org.hipparchus.exception.MathIllegalArgumentException;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.CholeskyDecomposition;
import org.jspecify.annotations.Nullable;

/**
 * Normal equations of a least-squares problem whose unknowns are expected at zero with sd 1 and
 * whose rows touch few of them: (1 + S' C^-1 S) step = S' C^-1 r - point, C the variance of {@link
 * Noise}.
 */
final class NormalEquations {
  private final int count;
  private final double[][] matrix;
  private final double[] right;

  private NormalEquations(double[] point) {
    this.count = point.length;
    this.matrix = new double[count][count];
    this.right = new double[count];
    for (int i = 0; i < count; i++) {
      matrix[i][i] = 1;
      right[i] = -point[i];
    }
  }

  static NormalEquations of(Linearized rows, Noise noise, double[] point) {
    NormalEquations equations = new NormalEquations(point);
    for (int[] note : noise.readings().notes()) {
      equations.add(rows, noise, note);
    }
    return equations;
  }

  private void add(Linearized rows, Noise noise, int[] note) {
    double[] together = new double[count];
    double residual = 0;
    for (int row : note) {
      double precision = noise.precision(row);
      double[] slopes = rows.slopes(row);
      rankOne(slopes, precision);
      for (int i = 0; i < count; i++) {
        right[i] += precision * slopes[i] * rows.residual(row);
        together[i] += precision * slopes[i];
      }
      residual += precision * rows.residual(row);
    }
    double left = noise.strayLeft(note);
    rankOne(together, -left);
    for (int i = 0; i < count; i++) {
      right[i] -= left * together[i] * residual;
    }
  }

  private void rankOne(double[] slopes, double factor) {
    for (int i = 0; i < count; i++) {
      double one = factor * slopes[i];
      if (one != 0) {
        double[] row = matrix[i];
        for (int j = 0; j <= i; j++) {
          row[j] += one * slopes[j];
        }
      }
    }
  }

  /** The solution; null where rounding has eaten it. */
  @Nullable Posterior solve() {
    for (int i = 0; i < count; i++) {
      for (int j = 0; j < i; j++) {
        matrix[j][i] = matrix[i][j];
      }
    }
    try {
      CholeskyDecomposition decomposition =
          new CholeskyDecomposition(new Array2DRowRealMatrix(matrix, false));
      double[] step = decomposition.getSolver().solve(new ArrayRealVector(right, false)).toArray();
      return new Posterior(decomposition.getL().getData(), step);
    } catch (MathIllegalArgumentException notPositive) {
      return null;
    }
  }

  /** Minus twice the logarithm of the posterior density, but for a constant. */
  static double cost(Linearized rows, Noise noise, double[] point) {
    double cost = 0;
    for (double one : point) {
      cost += one * one;
    }
    List<int[]> notes = noise.readings().notes();
    for (int[] note : notes) {
      double sum = 0;
      for (int row : note) {
        double weighed = noise.precision(row) * rows.residual(row);
        cost += weighed * rows.residual(row);
        sum += weighed;
      }
      cost -= noise.strayLeft(note) * sum * sum;
    }
    return cost;
  }
}
