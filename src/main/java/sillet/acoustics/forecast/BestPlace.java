package sillet.acoustics.forecast;

import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.neck.Setbacks;
import sillet.acoustics.solve.Outcome;

/**
 * Where a string then wants its saddle (and its nut edge), and how that place shifts with its
 * notes: weighted least squares by Gauss-Newton steps, which settle in three or four because notes
 * are nearly linear in both.
 */
final class BestPlace {
  private static final int MOST_STEPS = 12;
  private static final double SETTLED = 1e-9;
  private static final double STEP = 1e-5;

  private final Setbacks place;
  private final double[] notes;
  private final double[] saddlePull;
  private final double[] nutPull;

  private BestPlace(Setbacks place, double[] notes, double[] saddlePull, double[] nutPull) {
    this.place = place;
    this.notes = notes;
    this.saddlePull = saddlePull;
    this.nutPull = nutPull;
  }

  Setbacks place() {
    return place;
  }

  /** Cents of the notes aimed at, there. */
  double[] notes() {
    return notes;
  }

  /** m of saddle setback per cent of each note. */
  double[] saddlePull() {
    return saddlePull;
  }

  /** m of nut setback per cent of each note; zeros where the nut stays. */
  double[] nutPull() {
    return nutPull;
  }

  static Outcome<BestPlace> of(NotesThen aim, StringSituation then, boolean nutMoves) {
    Setbacks at = new Setbacks(then.lie().saddleSetback(), then.lie().nutSetback());
    for (int step = 0; step < MOST_STEPS; step++) {
      BestPlace here = around(aim, then, at, nutMoves);
      double saddle = along(here.saddlePull, here.notes);
      double nut = along(here.nutPull, here.notes);
      if (!Double.isFinite(saddle) || !Double.isFinite(nut)) {
        return Outcome.notSolved("the string cannot be tuned to its pitch");
      }
      if (Math.hypot(saddle, nut) < SETTLED) {
        return Outcome.solved(here);
      }
      at = new Setbacks(at.saddle() - saddle, at.nut() - nut);
    }
    return Outcome.notSolved("no place of the saddle suits the string");
  }

  /** How much farther back the saddle should stand if the notes were these. */
  double saddleShift(double[] cents) {
    return -shift(saddlePull, cents);
  }

  /** How much farther from the bridge the nut should stand if the notes were these. */
  double nutShift(double[] cents) {
    return -shift(nutPull, cents);
  }

  private double shift(double[] pull, double[] cents) {
    double sum = 0;
    for (int i = 0; i < pull.length; i++) {
      sum += pull[i] * (cents[i] - notes[i]);
    }
    return sum;
  }

  private static BestPlace around(
      NotesThen aim, StringSituation then, Setbacks at, boolean nutMoves) {
    double[] notes = aim.cents(NotesThen.at(then, at));
    double[] bySaddle =
        slopes(notes, aim.cents(NotesThen.at(then, new Setbacks(at.saddle() + STEP, at.nut()))));
    double[] byNut =
        slopes(notes, aim.cents(NotesThen.at(then, new Setbacks(at.saddle(), at.nut() + STEP))));
    double[] weights = aim.weights();
    double ss = weighed(weights, bySaddle, bySaddle);
    double sn = nutMoves ? weighed(weights, bySaddle, byNut) : 0;
    double nn = nutMoves ? weighed(weights, byNut, byNut) : 1;
    double determinant = ss * nn - sn * sn;
    double[] saddlePull = new double[notes.length];
    double[] nutPull = new double[notes.length];
    for (int i = 0; i < notes.length; i++) {
      double nut = nutMoves ? byNut[i] : 0;
      saddlePull[i] = weights[i] * (nn * bySaddle[i] - sn * nut) / determinant;
      nutPull[i] = weights[i] * (ss * nut - sn * bySaddle[i]) / determinant;
    }
    if (!nutMoves) {
      nutPull = new double[notes.length];
    }
    return new BestPlace(at, notes, saddlePull, nutPull);
  }

  private static double[] slopes(double[] here, double[] there) {
    double[] slopes = new double[here.length];
    for (int i = 0; i < slopes.length; i++) {
      slopes[i] = (there[i] - here[i]) / STEP;
    }
    return slopes;
  }

  private static double along(double[] pull, double[] cents) {
    double sum = 0;
    for (int i = 0; i < pull.length; i++) {
      sum += pull[i] * cents[i];
    }
    return sum;
  }

  private static double weighed(double[] weights, double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += weights[i] * a[i] * b[i];
    }
    return sum;
  }
}
