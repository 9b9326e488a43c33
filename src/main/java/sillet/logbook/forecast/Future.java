package sillet.logbook.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.logbook.moves.AcousticString;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.KnownNeck;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.strings.FittedString;

/**
 * The strings of an instrument as they will be; one that cannot be tuned does not stop the others.
 */
final class Future {
  private final KnownNeck neck;
  private final InstrumentChange change;
  private final AimChoice aim;

  Future(KnownNeck neck, InstrumentChange change, AimChoice aim) {
    this.neck = neck;
    this.change = change;
    this.aim = aim;
  }

  /** One for each string, in order. */
  List<FutureString> strings() {
    NutFreedom nut = nut();
    NeckEstimate estimate = neck.estimate();
    List<sillet.acoustics.forecast.StringForecast> together =
        estimate == null ? null : together(estimate, nut);
    List<FutureString> strings = new ArrayList<>();
    for (int i = 0; i < neck.strings().size(); i++) {
      int place = neck.place(i);
      if (estimate == null || place < 0) {
        strings.add(FutureString.notSolved(now(i), then(i), neck.because(i)));
      } else if (together != null) {
        strings.add(
            new FutureString(
                now(i), then(i), new Outlook(estimate, place, of(i), together.get(place)), ""));
      } else {
        strings.add(alone(i, nut == NutFreedom.WHOLE ? NutFreedom.FIXED : nut));
      }
    }
    return strings;
  }

  private @Nullable List<sillet.acoustics.forecast.StringForecast> together(
      NeckEstimate estimate, NutFreedom nut) {
    List<sillet.acoustics.forecast.StringChange> changes = new ArrayList<>();
    for (int i = 0; i < neck.strings().size(); i++) {
      if (neck.place(i) >= 0) {
        changes.add(of(i));
      }
    }
    return forecast(estimate, changes, nut)
            instanceof Solved<sillet.acoustics.forecast.InstrumentForecast> solved
        ? solved.value().strings()
        : null;
  }

  private Outcome<sillet.acoustics.forecast.InstrumentForecast> forecast(
      NeckEstimate estimate, List<sillet.acoustics.forecast.StringChange> changes, NutFreedom nut) {
    return sillet.acoustics.forecast.Forecaster.of(estimate, changes, aim.acoustic(), nut);
  }

  private FutureString alone(int index, NutFreedom nut) {
    KnownNeck only = KnownNeck.of(List.of(neck.strings().get(index)));
    NeckEstimate estimate = only.estimate();
    if (estimate == null) {
      return FutureString.notSolved(now(index), then(index), only.because(0));
    }
    var outcome = forecast(estimate, List.of(of(index)), nut);
    if (outcome instanceof Solved<sillet.acoustics.forecast.InstrumentForecast> solved) {
      Outlook outlook = new Outlook(estimate, 0, of(index), solved.value().strings().get(0));
      return new FutureString(now(index), then(index), outlook, "");
    }
    return FutureString.notSolved(
        now(index),
        then(index),
        ((NotSolved<sillet.acoustics.forecast.InstrumentForecast>) outcome).because());
  }

  private BenchString now(int index) {
    return neck.strings().get(index).now();
  }

  private FittedString then(int index) {
    FittedString now = now(index).string();
    return change.of(now.number()).fitted(now);
  }

  private sillet.acoustics.forecast.StringChange of(int index) {
    Double action12Mm = change.of(now(index).string().number()).action12Mm();
    return new sillet.acoustics.forecast.StringChange(
        stringing(now(index).string()),
        stringing(then(index)),
        action12Mm == null
            ? OptionalDouble.empty()
            : OptionalDouble.of(action12Mm * AcousticString.M_PER_MM),
        now(index).readings().against());
  }

  private static Stringing stringing(FittedString string) {
    return new Stringing(
        AcousticString.spec(string.make()),
        string.pitch().hz(),
        string.scaleMm() * AcousticString.M_PER_MM);
  }

  /** A nut that only some strings can shape is left where it is. */
  private NutFreedom nut() {
    List<NutMovable> nuts =
        neck.strings().stream().map(string -> string.now().room().nut()).toList();
    if (nuts.contains(NutMovable.WHOLE)) {
      return NutFreedom.WHOLE;
    }
    return nuts.contains(NutMovable.NO) ? NutFreedom.FIXED : NutFreedom.EACH;
  }
}
