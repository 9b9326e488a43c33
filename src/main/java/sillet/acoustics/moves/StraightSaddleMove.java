package sillet.acoustics.moves;

import java.util.List;

/**
 * How a saddle moves that only moves as a whole.
 *
 * @param first move at string 1, metres, positive away from the neck
 * @param last move at the last string
 * @param strings what that does to each string, in order; the interval of each is that of the best
 *     line at this string
 */
public record StraightSaddleMove(double first, double last, List<MoveEstimate> strings) {
  /** Copies the list. */
  public StraightSaddleMove {
    strings = List.copyOf(strings);
  }
}
