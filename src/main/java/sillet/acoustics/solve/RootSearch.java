package sillet.acoustics.solve;

import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.exception.MathIllegalStateException;

/**
 * Finds where a continuous function of one variable is zero, between two points where it has
 * opposite signs, and always comes back.
 *
 * <p>Method: bracketed Brent search with inverse polynomial interpolation of order 5, as Hipparchus
 * has it. The answer lies within {@code tolerance} of a change of sign, or within 1e-14 of it as a
 * share of its own size where that is more.
 *
 * <p>Edges: no opposite signs at the ends, a value that is not a number (or is infinite) anywhere
 * on the way, and more evaluations than allowed are each a {@link NotSolved}. A zero at an end is
 * the answer.
 */
public final class RootSearch {

  private static final double RELATIVE_TOLERANCE = 1e-14;
  private static final double FUNCTION_TOLERANCE = 1e-300;
  private static final int ORDER = 5;
  private static final int LEAST_EVALUATIONS = 3;

  private final double tolerance;
  private final int maxEvaluations;

  /**
   * A search that can be used again and again.
   *
   * @param tolerance how near to the change of sign, in the unit of the variable; above zero
   * @param maxEvaluations how often the function may be evaluated, the ends included; at least 3
   * @throws IllegalArgumentException where a parameter is out of range
   */
  public RootSearch(double tolerance, int maxEvaluations) {
    if (!(tolerance > 0) || Double.isInfinite(tolerance)) {
      throw new IllegalArgumentException("tolerance must be above zero, is " + tolerance);
    }
    if (maxEvaluations < LEAST_EVALUATIONS) {
      throw new IllegalArgumentException("too few evaluations to search with: " + maxEvaluations);
    }
    this.tolerance = tolerance;
    this.maxEvaluations = maxEvaluations;
  }

  /**
   * The zero of {@code function} between {@code low} and {@code high}.
   *
   * @throws IllegalArgumentException unless {@code low} and {@code high} are finite and in order
   */
  public Outcome<Double> find(DoubleUnaryOperator function, double low, double high) {
    if (!(low < high) || Double.isInfinite(low) || Double.isInfinite(high)) {
      throw new IllegalArgumentException("no bracket: " + low + " to " + high);
    }
    Watched watched = new Watched(function, low, high, maxEvaluations);
    try {
      return search(watched, low, high);
    } catch (GaveUp gaveUp) {
      return Outcome.notSolved(gaveUp.because);
    } catch (MathIllegalStateException numerical) {
      // the solver's own guard; the watch above should have spoken first
      return Outcome.notSolved("the search for a root broke off");
    }
  }

  private Outcome<Double> search(Watched watched, double low, double high) {
    double atLow = watched.value(low);
    if (atLow == 0) {
      return Outcome.solved(low);
    }
    double atHigh = watched.value(high);
    if (atHigh == 0) {
      return Outcome.solved(high);
    }
    if (atLow > 0 == atHigh > 0) {
      return Outcome.notSolved("no change of sign between " + low + " and " + high);
    }
    BracketingNthOrderBrentSolver solver =
        new BracketingNthOrderBrentSolver(RELATIVE_TOLERANCE, tolerance, FUNCTION_TOLERANCE, ORDER);
    return Outcome.solved(solver.solve(Integer.MAX_VALUE, watched::value, low, high));
  }

  /** Counts, remembers the two ends so that they are evaluated once, and stops at nonsense. */
  private static final class Watched {
    private final DoubleUnaryOperator function;
    private final double low;
    private final double high;
    private double atLow = Double.NaN;
    private double atHigh = Double.NaN;
    private int left;

    Watched(DoubleUnaryOperator function, double low, double high, int evaluations) {
      this.function = function;
      this.low = low;
      this.high = high;
      this.left = evaluations;
    }

    double value(double x) {
      if (x == low && !Double.isNaN(atLow)) {
        return atLow;
      }
      if (x == high && !Double.isNaN(atHigh)) {
        return atHigh;
      }
      double y = evaluate(x);
      if (x == low) {
        atLow = y;
      } else if (x == high) {
        atHigh = y;
      }
      return y;
    }

    private double evaluate(double x) {
      if (left-- == 0) {
        throw new GaveUp("no root within the allowed number of evaluations");
      }
      double y = function.applyAsDouble(x);
      if (Double.isNaN(y) || Double.isInfinite(y)) {
        throw new GaveUp("no number at " + x);
      }
      return y;
    }
  }

  /** Carries the reason out of the solver; never leaves this class, hence without a trace. */
  private static final class GaveUp extends RuntimeException {
    private static final long serialVersionUID = 1L;
    private final String because;

    GaveUp(String because) {
      super(because, null, false, false);
      this.because = because;
    }
  }
}
