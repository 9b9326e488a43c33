package sillet.acoustics.estimate;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Solved;

/**
 * Cents of one occasion at some frets (fret places left out), and their slopes by each quantity.
 */
final class SlopesByQuantity {
  /** In standard deviations of the quantity: small against curvature, large against rounding. */
  private static final double STEP = 1e-3;

  private final double[] cents;
  private final double[][] slopes;

  private SlopesByQuantity(double[] cents, double[][] slopes) {
    this.cents = cents;
    this.slopes = slopes;
  }

  /** Null where the string cannot be tuned or a note is none. */
  static @Nullable SlopesByQuantity of(
      OccasionModel model, double[] quantities, double[] sds, int[] frets, Reference against) {
    double[] here = cents(model, quantities, frets, against);
    if (here == null) {
      return null;
    }
    double[][] slopes = new double[Quantity.COUNT][];
    for (int q = 0; q < Quantity.COUNT; q++) {
      Sum sum = model.sum(Quantity.at(q));
      double step = STEP * sum.sd(sds);
      slopes[q] = new double[frets.length];
      if (step == 0) {
        continue;
      }
      double[] beside = quantities.clone();
      beside[q] += step;
      double[] there = cents(model, beside, frets, against);
      if (there == null) {
        return null;
      }
      for (int i = 0; i < frets.length; i++) {
        slopes[q][i] = (there[i] - here[i]) / step;
      }
    }
    return new SlopesByQuantity(here, slopes);
  }

  private static double @Nullable [] cents(
      OccasionModel model, double[] quantities, int[] frets, Reference against) {
    StringSituation situation = model.situation(quantities, FretPlaces.TRUE);
    if (!(FrettedPitch.of(situation.lie(), situation.fretting())
        instanceof Solved<FrettedPitch> solved)) {
      return null;
    }
    FrettedPitch pitch = solved.value();
    double reference = against == Reference.HARMONIC ? pitch.harmonicAgainstTwiceOpen() : 0;
    double[] cents = new double[frets.length];
    for (int i = 0; i < frets.length; i++) {
      cents[i] = pitch.centsAgainstOpen(frets[i]) - reference;
      if (!Double.isFinite(cents[i])) {
        return null;
      }
    }
    return cents;
  }

  double cents(int place) {
    return cents[place];
  }

  /** Slopes of one note by the unknowns, added into {@code into}. */
  void chain(int place, OccasionModel model, double[] sds, double[] into) {
    for (int q = 0; q < Quantity.COUNT; q++) {
      model.sum(Quantity.at(q)).chain(slopes[q][place], sds, into);
    }
  }
}
