package sillet.acoustics.moves;

import java.util.List;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * Finds moves. The whole model of {@code acoustics.neck} is used before and after a move, the open
 * string retuned in between; the plain length rule (1731.2/scale cents per metre at fret 12) is off
 * by up to 8 % on short scales and thick strings.
 *
 * <p>The 95 % interval adds the variances of what was read and of the model's own error ({@link
 * MoveTask#modelShare}). What was not read widens it and never stops the search; only a string that
 * no tension brings to pitch, or a reading that no place of the saddle explains, is not solved.
 */
public final class MoveSolver {
  private MoveSolver() {}

  /**
   * The best move of one string.
   *
   * @param task string, readings and aim
   * @return the estimate, or why there is none
   */
  public static Outcome<MoveEstimate> solve(MoveTask task) {
    return switch (task.aim()) {
      case OCTAVE -> OctaveMove.of(task);
      case NECK -> NeckMove.of(List.of(task), task.nutFree()).map(estimates -> estimates.get(0));
    };
  }

  /**
   * The best saddle moves together with one move of a nut that all strings share; the aim is {@link
   * Aim#NECK} whatever the tasks say.
   *
   * @param tasks the strings on that nut, at least one
   * @return estimates in the same order with the same nut move, or why there are none
   * @throws IllegalArgumentException if there is no task
   */
  public static Outcome<List<MoveEstimate>> solveWholeNut(List<MoveTask> tasks) {
    if (tasks.isEmpty()) {
      throw new IllegalArgumentException("no string on the nut");
    }
    return NeckMove.of(List.copyOf(tasks), true);
  }

  /**
   * What a saddle move other than the best one leaves at fret 12, as when the travel ends.
   *
   * @param task string and readings
   * @param saddleMove metres, positive away from the neck, finite
   * @return cents against the task's reference, or why there are none
   * @throws IllegalArgumentException if the move is not finite
   */
  public static Outcome<Double> cents12At(MoveTask task, double saddleMove) {
    if (!Double.isFinite(saddleMove)) {
      throw new IllegalArgumentException("move is " + saddleMove);
    }
    Outcome<OctaveMove.Present> present = OctaveMove.present(task);
    if (present instanceof NotSolved<OctaveMove.Present> not) {
      return Outcome.notSolved(not.because());
    }
    StringLie lie = ((Solved<OctaveMove.Present>) present).value().lie();
    double cents =
        OctaveNote.cents(lie.withSaddleSetback(lie.saddleSetback() + saddleMove), task.against());
    return Double.isFinite(cents)
        ? Outcome.solved(cents)
        : Outcome.notSolved("the string cannot be tuned to its pitch after such a move");
  }
}
