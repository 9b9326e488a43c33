package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.MoveTask;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.readings.FretReading;

/** Puts a string on the bench before {@code acoustics}. */
final class Solver {
  private Solver() {}

  /** The move that makes fret 12 true. */
  static MoveEstimate octave(BenchString string, List<FretReading> readings) {
    return MoveSolver.solve(task(string, readings, Aim.OCTAVE, false)).orElseThrow();
  }

  /** The best moves for the neck, every string estimated by itself. */
  static List<Move> oneByOne(
      List<BenchString> strings, List<List<FretReading>> readings, NutRoom nut) {
    List<MoveTask> tasks = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      tasks.add(task(strings.get(i), readings.get(i), Aim.NECK, nut != NutRoom.FIXED));
    }
    List<MoveEstimate> estimates =
        nut == NutRoom.WHOLE
            ? MoveSolver.solveWholeNut(tasks).orElseThrow()
            : tasks.stream().map(one -> MoveSolver.solve(one).orElseThrow()).toList();
    return estimates.stream().map(Solver::move).toList();
  }

  /** The best moves for the neck, all strings estimated together. */
  static List<Move> together(
      List<BenchString> strings, List<List<FretReading>> readings, NutRoom nut) {
    List<StringHistory> histories = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      BenchString string = strings.get(i);
      HeightSds heights =
          string.heightsMeasured()
              ? HeightSds.measured()
              : HeightSds.unknown(string.spec().construction());
      histories.add(
          StringHistory.of(
              Occasion.first(string.typed(), heights, string.against(), readings.get(i))));
    }
    return NeckEstimator.estimate(new InstrumentEvidence(histories))
        .flatMap(one -> MoveSolver.solve(one, Aim.NECK, NutFreedom.valueOf(nut.name())))
        .orElseThrow()
        .stream()
        .map(Solver::move)
        .toList();
  }

  static Move move(MoveEstimate estimate) {
    return new Move(
        estimate.saddleMove(), estimate.saddleLow(), estimate.saddleHigh(), estimate.nutMove());
  }

  private static MoveTask task(
      BenchString string, List<FretReading> readings, Aim aim, boolean nutFree) {
    double share = MoveTask.modelShareOf(string.typed().constants());
    return new MoveTask(string.typed(), readings, string.against(), aim, nutFree, share);
  }
}
