package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.forecast.Forecaster;
import sillet.acoustics.forecast.InstrumentForecast;
import sillet.acoustics.forecast.StringChange;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.readings.FretReading;

/** Puts the bench before {@code acoustics}. */
final class Solver {
  private Solver() {}

  /** What is known of the strings on one instrument. */
  static NeckEstimate estimate(List<BenchString> strings, List<List<FretReading>> readings) {
    List<StringHistory> histories = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      histories.add(StringHistory.of(occasion(strings.get(i), readings.get(i))));
    }
    return NeckEstimator.estimate(new InstrumentEvidence(histories)).orElseThrow();
  }

  private static Occasion occasion(BenchString string, List<FretReading> readings) {
    HeightSds heights =
        string.heightsMeasured()
            ? HeightSds.measured()
            : HeightSds.unknown(string.spec().construction());
    return Occasion.first(string.typed(), heights, string.against(), readings);
  }

  /** The moves that make fret 12 true. */
  static List<MoveEstimate> octave(List<BenchString> strings, List<List<FretReading>> readings) {
    return MoveSolver.solve(estimate(strings, readings), Aim.OCTAVE, NutFreedom.FIXED)
        .orElseThrow();
  }

  /** The same once the saddles were moved and fret 12 read again. */
  static List<MoveEstimate> octaveAgain(
      List<BenchString> strings,
      List<List<FretReading>> before,
      List<Double> moved,
      List<List<FretReading>> after) {
    List<StringHistory> histories = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      Occasion first = occasion(strings.get(i), before.get(i));
      Occasion second =
          new Occasion(
              2,
              1,
              first.lie(),
              first.heights(),
              OptionalDouble.of(moved.get(i)),
              0,
              first.against(),
              after.get(i));
      histories.add(new StringHistory(List.of(first, second)));
    }
    NeckEstimate estimate = NeckEstimator.estimate(new InstrumentEvidence(histories)).orElseThrow();
    return MoveSolver.solve(estimate, Aim.OCTAVE, NutFreedom.FIXED).orElseThrow();
  }

  /** The best moves for the neck. */
  static List<Move> neck(NeckEstimate estimate, NutFreedom nut) {
    return MoveSolver.solve(estimate, Aim.NECK, nut).orElseThrow().stream()
        .map(Solver::move)
        .toList();
  }

  /** Every string estimated by itself, as if it were alone on its instrument. */
  static List<NeckEstimate> oneByOne(List<BenchString> strings, List<List<FretReading>> readings) {
    List<NeckEstimate> estimates = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      estimates.add(estimate(List.of(strings.get(i)), List.of(readings.get(i))));
    }
    return estimates;
  }

  /** Where the saddles will have to stand for fret 12. */
  static InstrumentForecast forecast(NeckEstimate estimate, List<StringChange> changes) {
    return Forecaster.of(estimate, changes, Aim.OCTAVE, NutFreedom.FIXED).orElseThrow();
  }

  static Move move(MoveEstimate estimate) {
    return new Move(
        estimate.saddleMove(), estimate.saddleLow(), estimate.saddleHigh(), estimate.nutMove());
  }
}
