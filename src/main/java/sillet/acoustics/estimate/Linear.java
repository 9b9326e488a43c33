package sillet.acoustics.estimate;

import java.util.ArrayList;
import java.util.List;

/**
 * The least-squares problem at the most likely point, for those who try other explanations on it:
 * expectation change and columns more.
 *
 * @param rows one a reading, string by string, oldest first
 * @param unknowns independent, each expected at 0 in its own sd; their sds are those the estimate
 *     ended with
 * @param point most likely, in those sds
 */
public record Linear(List<Row> rows, List<Unknown> unknowns, List<Double> point) {
  /** Checks and copies. */
  public Linear {
    rows = List.copyOf(rows);
    unknowns = List.copyOf(unknowns);
    point = List.copyOf(point);
  }

  /** One reading. */
  public static final class Row {
    private final Misfit misfit;
    private final double[] slopes;

    Row(Misfit misfit, double[] slopes) {
      this.misfit = misfit;
      this.slopes = slopes;
    }

    /** Residual, sd without weight, weight. */
    public Misfit misfit() {
      return misfit;
    }

    /** Cents per unknown, in its sd. */
    public double slope(int unknown) {
      return slopes[unknown];
    }

    /** Copy of all slopes. */
    public double[] slopes() {
      return slopes.clone();
    }
  }

  static Linear of(List<Misfit> misfits, Solution solution, Linearized rows, double[] point) {
    List<Row> all = new ArrayList<>();
    for (int row = 0; row < misfits.size(); row++) {
      all.add(new Row(misfits.get(row), rows.slopes(row)));
    }
    List<Unknown> named = new ArrayList<>();
    List<Double> counted = new ArrayList<>();
    Unknowns unknowns = solution.model().unknowns();
    for (int i = 0; i < unknowns.count(); i++) {
      Unknown one = unknowns.at(i);
      named.add(new Unknown(one.kind(), one.string(), one.fret(), solution.sds()[i]));
      counted.add(point[i]);
    }
    return new Linear(all, named, counted);
  }
}
