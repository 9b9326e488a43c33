package sillet.acoustics.moves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.hipparchus.linear.RealMatrix;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.solve.Outcome;

/**
 * The moves of some strings together that make the weighted sum of squared cents least. What moves
 * is counted by coordinates; every string's saddle and nut go with some of them.
 */
final class NeckMoves {
  /** Width over which slopes are taken, metres. */
  private static final double STEP = 1e-5;

  /** Which coordinates move a string, each with a factor. */
  interface Linkage {
    int coordinates();

    double saddle(int place, double[] moves);

    double nut(int place, double[] moves);
  }

  private final NeckEstimate estimate;
  private final List<StringNow> strings;
  private final Aim aim;
  private final Linkage linkage;

  NeckMoves(NeckEstimate estimate, List<StringNow> strings, Aim aim, Linkage linkage) {
    this.estimate = estimate;
    this.strings = strings;
    this.aim = aim;
    this.linkage = linkage;
  }

  Outcome<List<MoveEstimate>> solve() {
    return CurveLeastSquares.fit(this::notes, new double[linkage.coordinates()], STEP)
        .flatMap(this::estimates);
  }

  /** Every note that counts, after the moves, times the root of its weight. */
  private double[] notes(double[] moves) {
    double[] notes = new double[strings.size() * aim.weights().size()];
    int row = 0;
    for (int i = 0; i < strings.size(); i++) {
      StringNow string = strings.get(i);
      FrettedPitch after = string.after(linkage.saddle(i, moves), linkage.nut(i, moves));
      if (after == null) {
        Arrays.fill(notes, Double.NaN);
        return notes;
      }
      for (Map.Entry<Integer, Double> one : aim.weights().entrySet()) {
        int fret = one.getKey();
        double cents =
            aim == Aim.OCTAVE
                ? string.octave().value() + string.octaveChange(after)
                : string.estimated(fret) + string.change(after, fret);
        notes[row++] = Math.sqrt(one.getValue()) * cents;
      }
    }
    return notes;
  }

  private Outcome<List<MoveEstimate>> estimates(CurveLeastSquares.Fit fit) {
    List<MoveEstimate> estimates = new ArrayList<>();
    // to first order the best moves are minus this times the notes before
    RealMatrix pulls = fit.covariance().multiplyTransposed(fit.slopes());
    double[] moves = fit.point().toArray();
    for (int i = 0; i < strings.size(); i++) {
      estimates.add(estimate(i, moves, sd(i, pulls)));
    }
    return Outcome.solved(List.copyOf(estimates));
  }

  /** How well the saddle's best place is known by the notes. */
  private double sd(int place, RealMatrix pulls) {
    double[][] weights = new double[estimate.strings()][NeckEstimate.LAST_FRET];
    int row = 0;
    for (StringNow string : strings) {
      for (Map.Entry<Integer, Double> one : aim.weights().entrySet()) {
        double[] column = pulls.getColumn(row++);
        double pull = linkage.saddle(place, column);
        weights[string.string()][one.getKey() - 1] = pull * Math.sqrt(one.getValue());
      }
    }
    Figure figure = estimate.weighed(weights);
    return figure.sd();
  }

  private MoveEstimate estimate(int place, double[] moves, double sdByNotes) {
    StringNow string = strings.get(place);
    double saddle = linkage.saddle(place, moves);
    double nut = linkage.nut(place, moves);
    return Moved.by(string, string.octave(), saddle, nut, sdByNotes);
  }
}
