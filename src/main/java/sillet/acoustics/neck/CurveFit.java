package sillet.acoustics.neck;

import java.util.Arrays;
import org.hipparchus.exception.MathIllegalArgumentException;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.DecompositionSolver;
import org.hipparchus.linear.QRDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.pitch.FretPositions;
import sillet.acoustics.solve.Outcome;

/**
 * What one string's cents over the neck consist of: cents_n = p / (gamma - 1) + q + r (gamma - 1),
 * gamma = 2^(n/12), which to first order is the whole of geometry, stretch and stiffness.
 *
 * <p>p = C kappa b^2 / (4 X0^2) comes from the height of the nut slot alone and neither saddle nor
 * nut position cures it; below zero beyond its sd it speaks of bad readings or uneven frets. q = C
 * (m / X0 + kappa b (b + c) / (2 X0^2)) is what a nut move takes away, r what a saddle move does.
 * Derived from Q = (b^2 / (gamma - 1) + 2 b (b + c) + (gamma - 1) (b + c)^2) / (2 X0^2), the
 * stretch of M. B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024), to first
 * order.
 *
 * <p>Method: weighted linear least squares by a QR decomposition.
 *
 * @param nutHeight p
 * @param offset q
 * @param slope r
 * @param residualRms root mean square in cents of what the three do not explain, over the readings
 */
public record CurveFit(Term nutHeight, Term offset, Term slope, double residualRms) {

  private static final int TERMS = 3;
  private static final double SINGULAR = 1e-12;

  /**
   * One coefficient.
   *
   * @param cents its size in cents
   * @param sd standard deviation in cents that the readings' own sd give it
   */
  public record Term(double cents, double sd) {}

  /**
   * The fit to readings that are all equally good.
   *
   * @param frets fret of each reading, 1 to 48, four different ones at least
   * @param cents against the open string
   * @param sd standard deviation of one reading in cents, above zero
   * @throws IllegalArgumentException where a parameter is out of range
   */
  public static Outcome<CurveFit> of(int[] frets, double[] cents, double sd) {
    double[] each = new double[frets.length];
    Arrays.fill(each, sd);
    return of(frets, cents, each);
  }

  /** As {@link #of(int[], double[], double)}, each reading with a standard deviation of its own. */
  public static Outcome<CurveFit> of(int[] frets, double[] cents, double[] sd) {
    requireReadings(frets, cents, sd);
    if (Arrays.stream(frets).distinct().count() <= TERMS) {
      return Outcome.notSolved("readings at four frets or more are needed");
    }
    double[][] rows = new double[frets.length][];
    double[] right = new double[frets.length];
    for (int i = 0; i < frets.length; i++) {
      double above = EqualTemperament.ratio(frets[i]) - 1;
      rows[i] = new double[] {1 / above / sd[i], 1 / sd[i], above / sd[i]};
      right[i] = cents[i] / sd[i];
    }
    try {
      return Outcome.solved(solve(new Array2DRowRealMatrix(rows, false), right, frets, cents));
    } catch (MathIllegalArgumentException singular) {
      return Outcome.notSolved("the readings do not tell the three causes apart");
    }
  }

  private static CurveFit solve(RealMatrix matrix, double[] right, int[] frets, double[] cents) {
    DecompositionSolver solver = new QRDecomposition(matrix, SINGULAR).getSolver();
    RealVector terms = solver.solve(new ArrayRealVector(right, false));
    RealMatrix inverse = solver.getInverse();
    RealMatrix covariance = inverse.multiplyTransposed(inverse);
    CurveFit fit =
        new CurveFit(
            new Term(terms.getEntry(0), Math.sqrt(covariance.getEntry(0, 0))),
            new Term(terms.getEntry(1), Math.sqrt(covariance.getEntry(1, 1))),
            new Term(terms.getEntry(2), Math.sqrt(covariance.getEntry(2, 2))),
            0);
    return new CurveFit(fit.nutHeight, fit.offset, fit.slope, fit.rmsOver(frets, cents));
  }

  /** Cents that the fit gives at a fret, 1 to 48. */
  public double centsAt(int fret) {
    FretPositions.requireFret(fret);
    double above = EqualTemperament.ratio(fret) - 1;
    return nutHeight.cents / above + offset.cents + slope.cents * above;
  }

  /** Saddle move in m, + away from the neck, that takes the slope away: r X0 / C. */
  public double saddleMove(double scale) {
    return slope.cents * scale / Cents.PER_UNIT;
  }

  /** Nut move in m, + toward the bridge, that takes the offset away: q X0 / C. */
  public double nutMove(double scale) {
    return offset.cents * scale / Cents.PER_UNIT;
  }

  private double rmsOver(int[] frets, double[] cents) {
    double sum = 0;
    for (int i = 0; i < frets.length; i++) {
      double left = cents[i] - centsAt(frets[i]);
      sum += left * left;
    }
    return Math.sqrt(sum / frets.length);
  }

  private static void requireReadings(int[] frets, double[] cents, double[] sd) {
    if (frets.length != cents.length || frets.length != sd.length) {
      throw new IllegalArgumentException("each reading has a fret, cents and an sd");
    }
    for (int i = 0; i < frets.length; i++) {
      FretPositions.requireFret(frets[i]);
      if (frets[i] == 0 || !Double.isFinite(cents[i]) || !(sd[i] > 0)) {
        throw new IllegalArgumentException("no reading to fit: fret " + frets[i]);
      }
    }
  }
}
