package sillet.acoustics.moves;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;

/** One string read once, by itself, and what to make of it. */
record MoveTask(
    StringLie lie, List<FretReading> readings, Reference against, Aim aim, boolean nutFree) {

  Outcome<MoveEstimate> solve() {
    return estimate(List.of(this))
        .flatMap(one -> MoveSolver.solve(one, aim, nutFree ? NutFreedom.EACH : NutFreedom.FIXED))
        .map(moves -> moves.get(0));
  }

  static Outcome<List<MoveEstimate>> solveWholeNut(List<MoveTask> tasks) {
    return estimate(tasks).flatMap(one -> MoveSolver.solve(one, Aim.NECK, NutFreedom.WHOLE));
  }

  Outcome<Double> cents12At(double saddleMove) {
    return estimate(List.of(this)).flatMap(one -> MoveSolver.cents12At(one, 0, saddleMove));
  }

  private static Outcome<NeckEstimate> estimate(List<MoveTask> tasks) {
    List<StringHistory> strings = new ArrayList<>();
    for (MoveTask task : tasks) {
      strings.add(
          StringHistory.of(
              Occasion.first(task.lie, HeightSds.measured(), task.against, task.readings)));
    }
    return NeckEstimator.estimate(new InstrumentEvidence(strings));
  }
}
