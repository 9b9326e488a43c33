package sillet.acoustics.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * Forecasts what other strings, another tuning or another action will ask of an instrument. Uses
 * what readings taught of it: the hand, the ends, nut, frets and heights, and the string itself
 * where it stays on; without a reading it answers from the specification, with wide intervals.
 */
public final class Forecaster {
  private Forecaster() {}

  /**
   * A forecast.
   *
   * @param estimate of the instrument as it is
   * @param changes one for each string of the estimate, in its order
   * @param aim what saddle and nut are to make true
   * @param nut how the nut can move; an aim at fret 12 leaves it where it is
   * @return the forecast; not solved where a string cannot be tuned to its pitch
   * @throws IllegalArgumentException if the changes are not as many as the strings
   */
  public static Outcome<InstrumentForecast> of(
      NeckEstimate estimate, List<StringChange> changes, Aim aim, NutFreedom nut) {
    if (changes.size() != estimate.strings()) {
      throw new IllegalArgumentException(
          changes.size() + " changes for " + estimate.strings() + " strings");
    }
    List<StringPlan> plans = new ArrayList<>();
    for (int string = 0; string < changes.size(); string++) {
      plans.add(new StringPlan(estimate, string, changes.get(string), aim));
    }
    NutFreedom freedom = aim.weights().size() == 1 ? NutFreedom.FIXED : nut;
    OptionalDouble whole = OptionalDouble.empty();
    if (freedom == NutFreedom.WHOLE) {
      Outcome<Double> there = commonNut(plans);
      if (there instanceof NotSolved<Double> not) {
        return Outcome.notSolved(not.because());
      }
      whole = OptionalDouble.of(there.orElseThrow());
    }
    return forecast(plans, freedom == NutFreedom.EACH, whole);
  }

  /** Where one nut suits all: the mean of what each wants, to first order the least squares. */
  private static Outcome<Double> commonNut(List<StringPlan> plans) {
    double sum = 0;
    for (StringPlan plan : plans) {
      Outcome<BestPlace> best = plan.best(true, OptionalDouble.empty());
      if (best instanceof NotSolved<BestPlace> not) {
        return Outcome.notSolved(not.because());
      }
      sum += best.orElseThrow().place().nut();
    }
    return Outcome.solved(sum / plans.size());
  }

  private static Outcome<InstrumentForecast> forecast(
      List<StringPlan> plans, boolean each, OptionalDouble whole) {
    List<StringLoad> now = new ArrayList<>();
    List<StringLoad> then = new ArrayList<>();
    List<StringOutlook> outlooks = new ArrayList<>();
    for (StringPlan plan : plans) {
      Outcome<BestPlace> best = plan.best(each, whole);
      Outcome<StringLoad> before = plan.loadNow();
      Outcome<StringLoad> after = best.flatMap(plan::loadThen);
      if (!(before instanceof Solved<StringLoad>) || !(after instanceof Solved<StringLoad>)) {
        return Outcome.notSolved("a string cannot be tuned to its pitch");
      }
      now.add(before.orElseThrow());
      then.add(after.orElseThrow());
      outlooks.add(plan.outlook(best.orElseThrow(), whole));
    }
    double equal = then.stream().mapToDouble(StringLoad::tension).average().orElse(0);
    List<StringForecast> strings = new ArrayList<>();
    for (int string = 0; string < plans.size(); string++) {
      strings.add(
          string(
              plans.get(string), outlooks.get(string), now.get(string), then.get(string), equal));
    }
    NeckPull pull =
        NeckPull.of(
            now.stream().map(StringLoad::tension).toList(),
            then.stream().map(StringLoad::tension).toList());
    return Outcome.solved(new InstrumentForecast(strings, pull));
  }

  private static StringForecast string(
      StringPlan plan, StringOutlook outlook, StringLoad now, StringLoad then, double equal) {
    NotesThen octave = plan.notes(new TreeMap<>(Map.of(12, 1.0)));
    Figure move = outlook.saddleMove();
    return new StringForecast(
        now,
        then,
        Feel.of(then.tension(), now.tension()),
        Feel.of(then.tension(), equal),
        plan.cents12Now(),
        outlook.centsIfLeft(octave),
        move,
        outlook.nutMove(),
        outlook.setbackThen(),
        outlook.centsAfter(octave, move));
  }
}
