package sillet.acoustics.bench;

import java.util.List;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.QRDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.VirtualString;

/** A virtual string asked for what the technician will never know. */
record Truth(VirtualString string, double scale) {
  private static final int FRETS = 12;
  private static final double STEP = 1e-5;
  private static final int ROUNDS = 8;

  /** A micrometre. */
  private static final double SETTLED = 1e-6;

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
    double last = Double.POSITIVE_INFINITY;
    for (int round = 0; round < ROUNDS && last > SETTLED; round++) {
      RealMatrix slopes = slopes(best, nutMoves ? 2 : 1);
      RealVector here = MatrixUtils.createRealVector(string.curve(best[0], best[1]));
      RealVector change = new QRDecomposition(slopes).getSolver().solve(here);
      for (int k = 0; k < change.getDimension(); k++) {
        best[k] -= change.getEntry(k);
      }
      last = change.getNorm();
    }
    return best;
  }

  /**
   * The same for strings on one nut that moves as a whole: setbacks of the saddles, then of the
   * nut.
   */
  static double[] bestForWholeNut(List<Truth> strings) {
    double[] best = new double[strings.size() + 1];
    int nut = strings.size();
    for (int round = 0; round < ROUNDS; round++) {
      RealMatrix slopes = MatrixUtils.createRealMatrix(FRETS * strings.size(), best.length);
      RealVector here = MatrixUtils.createRealVector(new double[FRETS * strings.size()]);
      for (int i = 0; i < strings.size(); i++) {
        double[] place = {best[i], best[nut]};
        RealMatrix own = strings.get(i).slopes(place, 2);
        double[] curve = strings.get(i).string.curve(place[0], place[1]);
        for (int n = 0; n < FRETS; n++) {
          slopes.setEntry(i * FRETS + n, i, own.getEntry(n, 0));
          slopes.setEntry(i * FRETS + n, nut, own.getEntry(n, 1));
          here.setEntry(i * FRETS + n, curve[n]);
        }
      }
      RealVector change = new QRDecomposition(slopes).getSolver().solve(here);
      for (int k = 0; k < best.length; k++) {
        best[k] -= change.getEntry(k);
      }
      if (change.getNorm() < SETTLED) {
        break;
      }
    }
    return best;
  }

  private RealMatrix slopes(double[] place, int unknowns) {
    RealVector here = MatrixUtils.createRealVector(string.curve(place[0], place[1]));
    RealMatrix slopes = MatrixUtils.createRealMatrix(FRETS, unknowns);
    for (int k = 0; k < unknowns; k++) {
      double[] beside = place.clone();
      beside[k] += STEP;
      RealVector there = MatrixUtils.createRealVector(string.curve(beside[0], beside[1]));
      slopes.setColumnVector(k, there.subtract(here).mapDivide(STEP));
    }
    return slopes;
  }

  double rms(double setback, double nutSetback) {
    return string.rms(setback, nutSetback);
  }
}
