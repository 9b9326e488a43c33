package sillet.desktop.history;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.VisitRecord;

/**
 * One thing measured, as received and as left.
 *
 * @param what kind, place and method
 * @param receivedMm null where it was not measured then
 * @param leftMm null where it was not measured then
 */
record CheckLine(What what, @Nullable Double receivedMm, @Nullable Double leftMm) {
  /** What makes two figures comparable: the same thing at the same place in the same way. */
  record What(CheckKind kind, int string, int fret, CheckMethod method) {
    static What of(BenchCheck check) {
      return new What(check.kind(), check.string(), check.fret(), check.method());
    }
  }

  /** The checks of a visit in the order they were first made; the newest figure of each counts. */
  static List<CheckLine> of(VisitRecord visit) {
    Map<What, @Nullable Double> received = new LinkedHashMap<>();
    Map<What, @Nullable Double> left = new LinkedHashMap<>();
    for (BenchCheck check : visit.checks()) {
      What what = What.of(check);
      received.putIfAbsent(what, null);
      (check.moment() == Moment.RECEIVED ? received : left).put(what, check.valueMm());
    }
    List<CheckLine> lines = new ArrayList<>();
    received.forEach((what, mm) -> lines.add(new CheckLine(what, mm, left.get(what))));
    return lines;
  }
}
