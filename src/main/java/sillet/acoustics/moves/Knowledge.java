package sillet.acoustics.moves;

import java.util.Arrays;
import java.util.List;
import org.hipparchus.linear.RealMatrix;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * What the readings and the {@link Prior} together say of a string: the most likely lie (maximum a
 * posteriori, linear about it), and how sure any weighted sum of its notes at frets 1 to 12 is.
 */
final class Knowledge {
  /** In standard deviations of the unknowns: small against curvature, large against rounding. */
  private static final double STEP = 1e-3;

  private final MoveTask task;
  private final Prior prior;
  private final StringLie lie;
  private final FrettedPitch now;
  private final double[][] noteSlopes;
  private final RealMatrix covariance;
  private final double[][] pulls;

  private Knowledge(MoveTask task, Prior prior, FrettedPitch now, CurveLeastSquares.Fit fit) {
    this.task = task;
    this.prior = prior;
    this.lie = prior.at(fit.point().toArray());
    this.now = now;
    this.covariance = fit.covariance();
    this.pulls = pulls(fit);
    this.noteSlopes = noteSlopes(fit.point().toArray());
  }

  static Outcome<Knowledge> of(MoveTask task) {
    return Prior.of(task.lie(), task.against()).flatMap(prior -> of(task, prior));
  }

  private static Outcome<Knowledge> of(MoveTask task, Prior prior) {
    return CurveLeastSquares.fit(
            unknowns -> misfits(task, prior, unknowns), new double[Prior.UNKNOWNS], STEP)
        .flatMap(
            fit ->
                FrettedPitch.of(prior.at(fit.point().toArray()))
                    .map(now -> new Knowledge(task, prior, now, fit)));
  }

  /** Readings and expectations, each against its standard deviation. */
  private static double[] misfits(MoveTask task, Prior prior, double[] unknowns) {
    List<FretReading> readings = task.readings();
    double[] misfits = new double[readings.size() + Prior.UNKNOWNS];
    System.arraycopy(unknowns, 0, misfits, readings.size(), Prior.UNKNOWNS);
    if (FrettedPitch.of(prior.at(unknowns)) instanceof Solved<FrettedPitch> solved) {
      for (int i = 0; i < readings.size(); i++) {
        FretReading reading = readings.get(i);
        double cents = OctaveNote.cents(solved.value(), reading.fret(), task.against());
        misfits[i] = (cents - reading.cents()) / sd(prior, reading);
      }
    } else {
      Arrays.fill(misfits, Double.NaN);
    }
    return misfits;
  }

  private static double sd(Prior prior, FretReading reading) {
    return Math.hypot(reading.sd(), prior.fretSd(reading.fret()));
  }

  /** How far a cent more in each reading pulls each unknown. */
  private double[][] pulls(CurveLeastSquares.Fit fit) {
    double[][] all = new double[task.readings().size()][];
    for (int i = 0; i < all.length; i++) {
      double sd = sd(prior, task.readings().get(i));
      all[i] = covariance.operate(fit.slopes().getRowVector(i)).mapDivide(sd).toArray();
    }
    return all;
  }

  private double[][] noteSlopes(double[] point) {
    double[][] slopes = new double[NeckCurve.FRETS][Prior.UNKNOWNS];
    for (int unknown = 0; unknown < Prior.UNKNOWNS; unknown++) {
      double[] beside = point.clone();
      beside[unknown] += STEP;
      FrettedPitch there = FrettedPitch.of(prior.at(beside)).orElseThrow();
      for (int fret = 1; fret <= NeckCurve.FRETS; fret++) {
        slopes[fret - 1][unknown] =
            (there.centsAgainstOpen(fret) - now.centsAgainstOpen(fret)) / STEP;
      }
    }
    return slopes;
  }

  StringLie lie() {
    return lie;
  }

  FrettedPitch now() {
    return now;
  }

  /** Variance of the sum of weight times true note, cents against the open string squared. */
  double variance(double[] weights) {
    double[] throughUnknowns = new double[Prior.UNKNOWNS];
    double variance = 0;
    double weightRead = 0;
    for (int fret = 1; fret <= NeckCurve.FRETS; fret++) {
      double weight = weights[fret - 1];
      if (task.at(fret) != null) {
        weightRead += weight;
        continue;
      }
      variance += square(weight * prior.fretSd(fret));
      for (int unknown = 0; unknown < Prior.UNKNOWNS; unknown++) {
        throughUnknowns[unknown] += weight * noteSlopes[fret - 1][unknown];
      }
    }
    for (double one : covariance.operate(throughUnknowns)) {
      variance += square(one);
    }
    for (int i = 0; i < pulls.length; i++) {
      FretReading reading = task.readings().get(i);
      double pulled = dot(throughUnknowns, pulls[i]);
      double own = reading.fret() <= NeckCurve.FRETS ? weights[reading.fret() - 1] : 0;
      variance += square((own + pulled) * reading.sd());
      variance += square(pulled * prior.fretSd(reading.fret()));
    }
    return variance + square(weightRead * harmonicSd());
  }

  /** How wrong the harmonic's place over the octave may be: bending errs by double the share. */
  private double harmonicSd() {
    return task.against() == Reference.HARMONIC
        ? 2 * lie.constants().relativeSd() * now.harmonicAgainstTwiceOpen()
        : 0;
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }

  private static double square(double value) {
    return value * value;
  }
}
