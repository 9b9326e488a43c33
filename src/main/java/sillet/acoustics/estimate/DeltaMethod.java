package sillet.acoustics.estimate;

import java.util.BitSet;
import java.util.function.ToDoubleFunction;

/** Carries what is not known of one string now into any figure of it, to first order. */
final class DeltaMethod {
  /** In standard deviations before reading. */
  private static final double STEP = 1e-3;

  private final Solution solution;
  private final OccasionModel now;
  private final double[] quantities;

  DeltaMethod(Solution solution, int string) {
    this.solution = solution;
    this.now = solution.model().now().get(string);
    this.quantities = now.quantities(solution.point(), solution.sds());
  }

  Figure figure(ToDoubleFunction<StringSituation> figure) {
    BitSet asked = new BitSet();
    FretPlaces frets = solution.frets();
    double value = figure.applyAsDouble(now.situation(quantities, frets.watched(asked)));
    double[] slopes = new double[solution.point().length];
    for (int q = 0; q < Quantity.COUNT; q++) {
      Sum sum = now.sum(Quantity.at(q));
      double step = STEP * sum.sd(solution.sds());
      if (step != 0) {
        double[] beside = quantities.clone();
        beside[q] += step;
        double there = figure.applyAsDouble(now.situation(beside, frets));
        sum.chain((there - value) / step, solution.sds(), slopes);
      }
    }
    double own = frets(figure, value, asked, slopes);
    return new Figure(value, Math.sqrt(solution.posterior().variance(slopes) + own));
  }

  /** Slopes by the places of the frets that the figure asked for. */
  private double frets(
      ToDoubleFunction<StringSituation> figure, double value, BitSet asked, double[] slopes) {
    double own = 0;
    double step = STEP * Expectations.FRET_PLACE;
    FretPlaces frets = solution.frets();
    for (int fret = asked.nextSetBit(1); fret >= 0; fret = asked.nextSetBit(fret + 1)) {
      FretPlaces moved = frets.with(fret, frets.at(fret) + step);
      double there = figure.applyAsDouble(now.situation(quantities, moved));
      own += solution.placeVariance(fret, (there - value) / step, slopes);
    }
    return own;
  }
}
