package sillet.desktop.sets;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sillet.acoustics.forecast.StringLoad;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.sets.TensionBalance;
import sillet.acoustics.solve.Solved;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringSet;
import sillet.logbook.units.Pitch;

/**
 * A set at a tuning and scale.
 *
 * @param set which
 * @param strings as far as set and tuning both go, string 1 first
 * @param balance total and mean; empty where a string cannot be brought to its pitch
 */
record SetFigures(StringSet set, List<StringFigures> strings, Optional<TensionBalance> balance) {
  private static final int SHORT_STRING = 5;

  SetFigures {
    strings = List.copyOf(strings);
  }

  static SetFigures of(StringSet set, List<Pitch> tuning, double scaleMm) {
    int count = Math.min(set.strings().size(), tuning.size());
    List<StringFigures> strings = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      double own = shortString(tuning, i + 1) ? shortScaleMm(scaleMm) : scaleMm;
      strings.add(
          StringFigures.of(new FittedString(i + 1, tuning.get(i), own, set.strings().get(i))));
    }
    return new SetFigures(set, strings, balance(strings));
  }

  /** A fifth string tuned above the first begins at a nut of its own at fret 5. */
  static boolean shortString(List<Pitch> tuning, int number) {
    return number == SHORT_STRING
        && tuning.size() == SHORT_STRING
        && tuning.get(number - 1).hz() > tuning.get(0).hz();
  }

  private static double shortScaleMm(double scaleMm) {
    return scaleMm / EqualTemperament.ratio(SHORT_STRING);
  }

  private static Optional<TensionBalance> balance(List<StringFigures> strings) {
    List<StringLoad> loads = new ArrayList<>();
    for (StringFigures one : strings) {
      if (one.load() instanceof Solved<StringLoad> solved) {
        loads.add(solved.value());
      }
    }
    boolean all = !loads.isEmpty() && loads.size() == strings.size();
    return all ? Optional.of(new TensionBalance(loads)) : Optional.empty();
  }

  /** What every string would pull if all pulled alike, N. */
  OptionalDouble equalN() {
    return balance.map(one -> OptionalDouble.of(one.mean())).orElse(OptionalDouble.empty());
  }

  /** Load on the neck, N. */
  OptionalDouble totalN() {
    return balance.map(one -> OptionalDouble.of(one.total())).orElse(OptionalDouble.empty());
  }

  /** The hardest pull of a string, N; 0 where none is known. */
  double mostN() {
    return strings.stream().flatMapToDouble(one -> one.tensionN().stream()).max().orElse(0);
  }
}
