package sillet.acoustics.bench;

import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import sillet.acoustics.moves.Reference;
import sillet.acoustics.virtual.VirtualString;

/** A virtual string asked for what the technician will never know. */
record Truth(VirtualString string, double scale) {
  private static final int FRETS = 12;
  private static final double STEP = 1e-5;
  private static final int ROUNDS = 6;

  double cents(int fret, Reference against, double setback) {
    return against == Reference.OPEN
        ? string.centsAgainstOpen(fret, setback, 0)
        : string.centsAgainstHarmonic(fret, setback, 0);
  }

  /** The saddle setback at which fret 12 is true. */
  double bestForOctave(Reference against) {
    return new BracketingNthOrderBrentSolver(1e-12, 1e-10, 5)
        .solve(200, s -> cents(12, against, s), -0.02 * scale, 0.05 * scale);
  }

  /** Saddle and nut setbacks at which the squared cents of frets 1 to 12 are least. */
  double[] bestForNeck(boolean nutMoves) {
    double[] best = {0, 0};
    int unknowns = nutMoves ? 2 : 1;
    for (int round = 0; round < ROUNDS; round++) {
      RealVector here = MatrixUtils.createRealVector(string.curve(best[0], best[1]));
      RealMatrix slopes = MatrixUtils.createRealMatrix(FRETS, unknowns);
      for (int k = 0; k < unknowns; k++) {
        double[] beside = best.clone();
        beside[k] += STEP;
        RealVector there = MatrixUtils.createRealVector(string.curve(beside[0], beside[1]));
        slopes.setColumnVector(k, there.subtract(here).mapDivide(STEP));
      }
      RealVector change =
          new LUDecomposition(slopes.transposeMultiply(slopes))
              .getSolver()
              .solve(slopes.transpose().operate(here));
      for (int k = 0; k < unknowns; k++) {
        best[k] -= change.getEntry(k);
      }
    }
    return best;
  }

  double rms(double setback, double nutSetback) {
    return string.rms(setback, nutSetback);
  }
}
