package sillet.acoustics.moves;

import java.util.function.UnaryOperator;
import org.hipparchus.exception.MathIllegalArgumentException;
import org.hipparchus.exception.MathIllegalStateException;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LeastSquaresBuilder;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LeastSquaresOptimizer.Optimum;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LeastSquaresProblem.Evaluation;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LevenbergMarquardtOptimizer;
import org.hipparchus.util.Pair;
import sillet.acoustics.solve.Outcome;

/**
 * Least squares over smooth curves whose slopes are taken by central differences: Hipparchus'
 * Levenberg-Marquardt with a cap, done when a step is far below what slopes were taken over, and a
 * failure instead of nonsense.
 */
final class CurveLeastSquares {
  private static final int MOST_EVALUATIONS = 60;

  /** Of the sum of squares and of the unknowns; slopes are good to 1e-7. */
  private static final double TOLERANCE = 1e-9;

  /**
   * Settled, as a share of the step for slopes; where a curve has a kink, steps stay this small.
   */
  private static final double NEAR = 1e-2;

  /** Below this share two directions count as the same. */
  private static final double SINGULAR = 1e-12;

  private CurveLeastSquares() {}

  /**
   * The least-squares point.
   *
   * @param point the unknowns
   * @param slopes derivative of each value by each unknown there
   * @param covariance inverse of slopes' times slopes
   */
  record Fit(RealVector point, RealMatrix slopes, RealMatrix covariance) {}

  /** Makes the sum of squares of {@code values} least; slopes from a step of the given width. */
  static Outcome<Fit> fit(UnaryOperator<double[]> values, double[] start, double step) {
    try {
      int rows = watched(values, start).length;
      Optimum optimum =
          new LevenbergMarquardtOptimizer()
              .withCostRelativeTolerance(TOLERANCE)
              .withParameterRelativeTolerance(TOLERANCE)
              .optimize(
                  new LeastSquaresBuilder()
                      .model(point -> valueAndSlopes(values, point.toArray(), step))
                      .start(start)
                      .target(new double[rows])
                      .checker((round, before, now) -> near(before, now, step))
                      .maxEvaluations(MOST_EVALUATIONS)
                      .maxIterations(MOST_EVALUATIONS)
                      .build());
      return Outcome.solved(
          new Fit(optimum.getPoint(), optimum.getJacobian(), optimum.getCovariances(SINGULAR)));
    } catch (NoNumber | MathIllegalStateException | MathIllegalArgumentException notThere) {
      return Outcome.notSolved("no best place of saddle and nut was found for these readings");
    }
  }

  private static boolean near(Evaluation before, Evaluation now, double step) {
    return before.getPoint().getLInfDistance(now.getPoint()) <= NEAR * step;
  }

  private static Pair<RealVector, RealMatrix> valueAndSlopes(
      UnaryOperator<double[]> values, double[] point, double step) {
    double[] here = watched(values, point);
    RealMatrix slopes = new Array2DRowRealMatrix(here.length, point.length);
    for (int column = 0; column < point.length; column++) {
      double[] above = watched(values, shifted(point, column, step));
      double[] below = watched(values, shifted(point, column, -step));
      for (int row = 0; row < here.length; row++) {
        slopes.setEntry(row, column, (above[row] - below[row]) / (2 * step));
      }
    }
    return new Pair<>(new ArrayRealVector(here, false), slopes);
  }

  private static double[] shifted(double[] point, int place, double by) {
    double[] shifted = point.clone();
    shifted[place] += by;
    return shifted;
  }

  private static double[] watched(UnaryOperator<double[]> values, double[] point) {
    double[] result = values.apply(point);
    for (double one : result) {
      if (!Double.isFinite(one)) {
        throw new NoNumber();
      }
    }
    return result;
  }

  /** Leaves the optimizer where the curve has no value; never leaves this class. */
  private static final class NoNumber extends RuntimeException {
    private static final long serialVersionUID = 1L;

    NoNumber() {
      super("no number", null, false, false);
    }
  }
}
