package sillet.acoustics.estimate;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Every reading against the model at one point: what is left over, and its slopes. */
final class Linearized {
  private final double[] residuals;
  private final double[][] slopes;

  private Linearized(double[] residuals, double[][] slopes) {
    this.residuals = residuals;
    this.slopes = slopes;
  }

  /** Null where a string cannot be tuned at that point. */
  static @Nullable Linearized at(
      InstrumentModel model, Readings readings, double[] point, double[] sds) {
    double[] residuals = new double[readings.count()];
    double[][] slopes = new double[readings.count()][];
    int row = 0;
    List<OccasionModel> occasions = model.occasions();
    for (OccasionModel occasion : occasions) {
      int[] frets = occasion.frets();
      double[] quantities = occasion.quantities(point, sds);
      SlopesByQuantity curve =
          SlopesByQuantity.of(occasion, quantities, sds, frets, occasion.occasion().against());
      if (curve == null) {
        return null;
      }
      StringSituation situation = occasion.situation(quantities, model.frets(point, sds));
      for (int i = 0; i < frets.length; i++) {
        double cents = curve.cents(i) + situation.placeCents(frets[i]);
        residuals[row] = readings.at(row).cents() - cents;
        slopes[row] = new double[point.length];
        curve.chain(i, occasion, sds, slopes[row]);
        int place = model.unknowns().placeOfFret(frets[i]);
        slopes[row][place] = sds[place] * situation.centsPerMetreOfPlace(frets[i]);
        residuals[row] -= model.body(occasion, frets[i], point, sds, slopes[row]);
        row++;
      }
    }
    return new Linearized(residuals, slopes);
  }

  /** Counts the unknowns in other sds, each so many times what it was; nothing else changes. */
  void countIn(double[] factors) {
    for (double[] row : slopes) {
      for (int i = 0; i < row.length; i++) {
        row[i] *= factors[i];
      }
    }
  }

  double residual(int row) {
    return residuals[row];
  }

  double[] slopes(int row) {
    return slopes[row];
  }
}
