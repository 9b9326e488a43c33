package sillet.acoustics.moves;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * A floating bridge or a saddle of one piece that moves as a whole: every string's move lies on the
 * straight line between its two ends, strings evenly spaced.
 */
public final class StraightSaddle {
  private StraightSaddle() {}

  /**
   * The best straight line: least squares over all strings together.
   *
   * @param estimate of the instrument
   * @param aim what to make true
   * @return the two ends and what is left a string, or why there is none
   */
  public static Outcome<StraightSaddleMove> solve(NeckEstimate estimate, Aim aim) {
    return strings(estimate)
        .flatMap(
            strings ->
                new NeckMoves(estimate, strings, aim, new Line(strings.size()))
                    .solve()
                    .map(StraightSaddle::move));
  }

  /**
   * What a line with given ends leaves.
   *
   * @param first move at string 1, metres, positive away from the neck, finite
   * @param last move at the last string, finite
   * @throws IllegalArgumentException if a move is not finite
   */
  public static Outcome<StraightSaddleMove> given(
      NeckEstimate estimate, double first, double last) {
    if (!Double.isFinite(first) || !Double.isFinite(last)) {
      throw new IllegalArgumentException("ends move by " + first + " and " + last);
    }
    return strings(estimate).flatMap(strings -> given(strings, first, last));
  }

  private static Outcome<StraightSaddleMove> given(
      List<StringNow> strings, double first, double last) {
    Line line = new Line(strings.size());
    List<MoveEstimate> moves = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      StringNow string = strings.get(i);
      double move = line.saddle(i, new double[] {first, last});
      if (string.after(move, 0) == null) {
        return Outcome.notSolved("the string cannot be tuned to its pitch after such a move");
      }
      moves.add(Moved.by(string, string.octave(), move, 0, 0));
    }
    return Outcome.solved(new StraightSaddleMove(first, last, moves));
  }

  private static StraightSaddleMove move(List<MoveEstimate> strings) {
    double first = strings.get(0).saddleMove();
    double last = strings.get(strings.size() - 1).saddleMove();
    return new StraightSaddleMove(first, last, strings);
  }

  private static Outcome<List<StringNow>> strings(NeckEstimate estimate) {
    List<StringNow> all = new ArrayList<>();
    for (int string = 0; string < estimate.strings(); string++) {
      Outcome<StringNow> one = StringNow.of(estimate, string);
      if (one instanceof Solved<StringNow> solved) {
        all.add(solved.value());
      } else if (one instanceof NotSolved<StringNow> not) {
        return Outcome.notSolved(not.because());
      }
    }
    return Outcome.solved(all);
  }

  /** Two ends; one string has only one. */
  private record Line(int strings) implements NeckMoves.Linkage {
    @Override
    public int coordinates() {
      return Math.min(2, strings);
    }

    @Override
    public double saddle(int place, double[] moves) {
      if (strings == 1) {
        return moves[0];
      }
      double along = place / (strings - 1.0);
      return (1 - along) * moves[0] + along * moves[1];
    }

    @Override
    public double nut(int place, double[] moves) {
      return 0;
    }
  }
}
