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

  /** Of the unknowns that a row touches; used again for every row. */
  private final int[] places;

  private NormalEquations(double[] point) {
    this.count = point.length;
    this.matrix = new double[count][count];
    this.right = new double[count];
    this.places = new int[count];
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
    if (note.length == 1) {
      addOne(rows, noise, note);
      return;
    }
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

  /** The same for a note that was read once, in one go. */
  private void addOne(Linearized rows, Noise noise, int[] note) {
    double precision = noise.precision(note[0]);
    double joint = precision - noise.strayLeft(note) * precision * precision;
    double[] slopes = rows.slopes(note[0]);
    double residual = joint * rows.residual(note[0]);
    rankOne(slopes, joint);
    for (int i = 0; i < count; i++) {
      right[i] += residual * slopes[i];
    }
  }

  private void rankOne(double[] slopes, double factor) {
    int touched = 0;
    for (int i = 0; i < count; i++) {
      if (slopes[i] != 0) {
        places[touched++] = i;
      }
    }
    for (int i = 0; i < touched; i++) {
      double[] row = matrix[places[i]];
      double one = factor * slopes[places[i]];
      for (int j = 0; j <= i; j++) {
        row[places[j]] += one * slopes[places[j]];
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
