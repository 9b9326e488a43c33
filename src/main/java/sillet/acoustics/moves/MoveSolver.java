package sillet.acoustics.moves;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * Finds moves. The whole model of {@code acoustics.neck} is used before and after a move, the open
 * string retuned in between; the plain length rule (1731.2/scale cents per metre at fret 12) is off
 * by up to 8 % on short scales and thick strings.
 *
 * <p>The 95 % interval holds what was read, what was not, and the model's own error. What was not
 * read widens it and never stops the search; only a string that no tension brings to pitch, or a
 * reading that no place of the saddle explains, is not solved.
 */
public final class MoveSolver {
  private MoveSolver() {}

  /**
   * The best moves of all strings of an instrument.
   *
   * @param estimate of the instrument
   * @param aim what to make true; with {@link Aim#OCTAVE} the nut stays
   * @param nut how the nut can move
   * @return one a string, in order, or why there are none
   */
  public static Outcome<List<MoveEstimate>> solve(NeckEstimate estimate, Aim aim, NutFreedom nut) {
    if (aim == Aim.OCTAVE) {
      OctaveMoves octaves = new OctaveMoves(estimate);
      return forEach(estimate, string -> octaves.of(string));
    }
    Outcome<List<StringNow>> strings = forEach(estimate, string -> StringNow.of(estimate, string));
    return strings.flatMap(
        all ->
            nut == NutFreedom.WHOLE
                ? new NeckMoves(estimate, all, aim, new OneNut(all.size())).solve()
                : oneByOne(estimate, all, aim, nut == NutFreedom.EACH));
  }

  private static Outcome<List<MoveEstimate>> oneByOne(
      NeckEstimate estimate, List<StringNow> all, Aim aim, boolean nutMoves) {
    OwnEdges edges = new OwnEdges(nutMoves && aim.weights().size() > 1);
    return forEach(
        estimate,
        string ->
            new NeckMoves(estimate, List.of(all.get(string)), aim, edges)
                .solve()
                .map(moves -> moves.get(0)));
  }

  /**
   * What a saddle move other than the best one leaves at fret 12, as when the travel ends.
   *
   * @param estimate of the instrument
   * @param string 0 first
   * @param saddleMove metres, positive away from the neck, finite
   * @return cents against the string's own reference, or why there are none
   * @throws IllegalArgumentException if the move is not finite
   */
  public static Outcome<Double> cents12At(NeckEstimate estimate, int string, double saddleMove) {
    if (!Double.isFinite(saddleMove)) {
      throw new IllegalArgumentException("move is " + saddleMove);
    }
    return new OctaveMoves(estimate).left(string, saddleMove);
  }

  /** One result a string, or the first reason why there is none. */
  private interface PerString<T> {
    Outcome<T> of(int string);
  }

  private static <T> Outcome<List<T>> forEach(NeckEstimate estimate, PerString<T> what) {
    List<T> all = new ArrayList<>();
    for (int string = 0; string < estimate.strings(); string++) {
      Outcome<T> one = what.of(string);
      if (one instanceof Solved<T> solved) {
        all.add(solved.value());
      } else if (one instanceof NotSolved<T> not) {
        return Outcome.notSolved(not.because());
      }
    }
    return Outcome.solved(List.copyOf(all));
  }

  /** One string: its saddle, and its edge of the nut where that moves. */
  private record OwnEdges(boolean nutMoves) implements NeckMoves.Linkage {
    @Override
    public int coordinates() {
      return nutMoves ? 2 : 1;
    }

    @Override
    public double saddle(int place, double[] moves) {
      return moves[0];
    }

    @Override
    public double nut(int place, double[] moves) {
      return nutMoves ? moves[1] : 0;
    }
  }

  /** A saddle each and the same nut. */
  private record OneNut(int strings) implements NeckMoves.Linkage {
    @Override
    public int coordinates() {
      return strings + 1;
    }

    @Override
    public double saddle(int place, double[] moves) {
      return moves[place];
    }

    @Override
    public double nut(int place, double[] moves) {
      return moves[strings];
    }
  }
}
