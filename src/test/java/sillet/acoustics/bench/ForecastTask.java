package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.forecast.StringChange;
import sillet.acoustics.forecast.StringForecast;
import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.SetChange;
import sillet.acoustics.virtual.VirtualInstrument;
import sillet.acoustics.virtual.Workshop;
import sillet.acoustics.wire.StringSpec;

/**
 * An instrument gets other gauges, another tuning and another action at once; each saddle is set
 * once to where the forecast wants it, and fret 12 is asked of the virtual instrument.
 */
final class ForecastTask implements Task {
  private static final String TASK = "forecast: gauge, tuning, action";
  static final Row MEASURED = new Row(TASK, "nine frets read, heights measured");
  static final Row SAME_MAKE = new Row(TASK, "of these, same make of strings");
  static final Row OTHER_MAKE = new Row(TASK, "of these, another make");
  static final Row NO_GUESS = new Row(TASK, "of these, plain or core known in both sets");
  static final Row UNMEASURED = new Row(TASK, "nine frets read, heights not measured");
  static final Row OCTAVE_READ = new Row(TASK, "fret 12 read, heights measured");
  static final Row UNREAD = new Row(TASK, "nothing read, heights measured");

  private static final int[] FRETS = {1, 2, 3, 5, 7, 9, 12, 15, 17};

  @Override
  public void run(Case one, Score score) {
    Luck luck = one.luck(this, 1);
    Workshop workshop = new Workshop(one.luck(this, 0), 0);
    VirtualInstrument before = workshop.build(one.kind());
    SetChange change = SetChange.draw(luck);
    VirtualInstrument after = workshop.restring(before, change);
    Technician neck = new Technician(luck, Technician.Habits.usual(NeckTask.SCATTER));
    Technician octave = new Technician(luck, Technician.Habits.usual(OctaveTask.SCATTER));
    for (boolean heights : new boolean[] {true, false}) {
      List<BenchString> strings = neck.takeIn(before, heights, Reference.OPEN);
      List<List<FretReading>> nine = new ArrayList<>();
      List<List<FretReading>> twelve = new ArrayList<>();
      List<List<FretReading>> none = new ArrayList<>();
      List<StringChange> changes = new ArrayList<>();
      for (int i = 0; i < strings.size(); i++) {
        nine.add(neck.read(strings.get(i), FRETS));
        twelve.add(List.of(octave.read(strings.get(i), 12)));
        none.add(List.of());
        changes.add(change(strings.get(i), after.strings().get(i), change, neck));
      }
      if (heights) {
        Row make = change.sameMake() ? SAME_MAKE : OTHER_MAKE;
        set(score, List.of(MEASURED, make, NO_GUESS), strings, nine, changes, after);
        set(score, List.of(OCTAVE_READ), strings, twelve, changes, after);
        set(score, List.of(UNREAD), strings, none, changes, after);
      } else {
        set(score, List.of(UNMEASURED), strings, nine, changes, after);
      }
    }
  }

  private static StringChange change(
      BenchString string, VirtualInstrument.Course then, SetChange change, Technician technician) {
    Stringing now = new Stringing(string.spec(), string.typed().openHz(), string.typed().scale());
    double action = string.truth().string().clearance(12) + change.higherAtTwelve();
    return new StringChange(
        now,
        new Stringing(technician.spec(then), then.plan().hz(), string.typed().scale()),
        OptionalDouble.of(action),
        Reference.OPEN);
  }

  private static void set(
      Score score,
      List<Row> rows,
      List<BenchString> strings,
      List<List<FretReading>> readings,
      List<StringChange> changes,
      VirtualInstrument after) {
    List<StringForecast> forecasts =
        Solver.forecast(Solver.estimate(strings, readings), changes).strings();
    for (int i = 0; i < strings.size(); i++) {
      BenchString string = strings.get(i);
      Truth then = new Truth(after.strings().get(i).string(), string.truth().scale());
      boolean absolute = readings.get(i).isEmpty();
      // nothing read: the saddle is set by rule from its nominal place
      Figure figure = absolute ? forecasts.get(i).setbackThen() : forecasts.get(i).saddleMove();
      double from = absolute ? 0 : string.found();
      boolean guess = guessed(changes.get(i).now()) || guessed(changes.get(i).then());
      for (Row row : rows) {
        if (guess && row.equals(NO_GUESS)) {
          continue;
        }
        Tally tally = score.of(row, string.kind());
        tally.error(then.cents(12, Reference.OPEN, from + figure.value()));
        tally.interval(figure.low(), then.bestForOctave(Reference.OPEN) - from, figure.high());
      }
    }
  }

  /** Whether the thickness of the core had to be guessed. */
  private static boolean guessed(Stringing stringing) {
    StringSpec spec = stringing.spec();
    return spec.construction().wound() && spec.core() == null;
  }
}
