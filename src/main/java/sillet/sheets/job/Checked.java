package sillet.sheets.job;

import java.util.List;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;

/** What was really measured: the newest figure of its kind, nothing estimated between strings. */
public final class Checked {
  private static final int OCTAVE = 12;

  private Checked() {}

  /** The gap over fret 12 of an open string, millimetres; null if it was not measured. */
  public static @Nullable Double action12Mm(List<BenchCheck> checks, int string, Moment moment) {
    return newest(
        checks,
        c -> c.kind() == CheckKind.ACTION && c.string() == string && c.moment() == moment,
        c -> c.method() == CheckMethod.OPEN && c.fret() == OCTAVE);
  }

  /** The relief by straightedge, millimetres; null if it was not measured. */
  public static @Nullable Double reliefMm(List<BenchCheck> checks, int string, Moment moment) {
    return newest(
        checks,
        c ->
            c.kind() == CheckKind.RELIEF
                && (c.string() == string || c.string() == BenchCheck.WHOLE_NECK)
                && c.moment() == moment,
        c -> c.method() == CheckMethod.STRAIGHTEDGE);
  }

  /** The newest of one thing counts; where it was measured otherwise, there is no such figure. */
  private static @Nullable Double newest(
      List<BenchCheck> checks, Predicate<BenchCheck> thing, Predicate<BenchCheck> comparable) {
    return checks.stream()
        .filter(thing)
        .reduce((older, newer) -> newer)
        .filter(comparable)
        .map(BenchCheck::valueMm)
        .orElse(null);
  }
}
