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
        check ->
            check.kind() == CheckKind.ACTION
                && check.method() == CheckMethod.OPEN
                && check.fret() == OCTAVE
                && check.string() == string
                && check.moment() == moment);
  }

  /** The relief by straightedge, millimetres; null if it was not measured. */
  public static @Nullable Double reliefMm(List<BenchCheck> checks, int string, Moment moment) {
    return newest(
        checks,
        check ->
            check.kind() == CheckKind.RELIEF
                && check.method() == CheckMethod.STRAIGHTEDGE
                && (check.string() == string || check.string() == BenchCheck.WHOLE_NECK)
                && check.moment() == moment);
  }

  private static @Nullable Double newest(List<BenchCheck> checks, Predicate<BenchCheck> wanted) {
    Double found = null;
    for (BenchCheck check : checks) {
      found = wanted.test(check) ? Double.valueOf(check.valueMm()) : found;
    }
    return found;
  }
}
