package sillet.logbook.visits;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.Heights;

/**
 * How high each string lies, from the checks of a visit. Often only the outer strings are measured;
 * those between lie on a line, as the strings follow the board.
 */
final class StringHeights {
  private final List<BenchCheck> checks;

  private StringHeights(List<BenchCheck> checks) {
    this.checks = checks;
  }

  /** As the instrument came in: only what was measured then counts. */
  static StringHeights received(List<BenchCheck> checks) {
    return new StringHeights(checks.stream().filter(c -> c.moment() == Moment.RECEIVED).toList());
  }

  /**
   * As it stands after work: what was measured as left goes before what was measured as received.
   */
  static StringHeights left(List<BenchCheck> checks) {
    List<BenchCheck> ordered = new ArrayList<>(received(checks).checks);
    checks.stream().filter(c -> c.moment() == Moment.LEFT).forEach(ordered::add);
    return new StringHeights(ordered);
  }

  Heights of(int string) {
    return new Heights(
        along(string, CheckKind.ACTION),
        along(string, CheckKind.FIRST_FRET_CLEARANCE),
        along(string, CheckKind.RELIEF),
        onALine(string, CheckKind.ACTION) || onALine(string, CheckKind.FIRST_FRET_CLEARANCE));
  }

  private boolean onALine(int string, CheckKind kind) {
    boolean here = MeasuredHeights.byString(checks, kind).containsKey(string);
    return !here && along(string, kind) != null;
  }

  private @Nullable Double along(int string, CheckKind kind) {
    NavigableMap<Integer, Double> measured = MeasuredHeights.byString(checks, kind);
    Double whole = measured.remove(BenchCheck.WHOLE_NECK);
    return measured.isEmpty() ? whole : between(string, measured);
  }

  private static @Nullable Double between(int string, NavigableMap<Integer, Double> measured) {
    Map.Entry<Integer, Double> below = measured.floorEntry(string);
    Map.Entry<Integer, Double> above = measured.ceilingEntry(string);
    if (below == null || above == null) {
      return null;
    }
    int strings = above.getKey() - below.getKey();
    double share = strings == 0 ? 0 : (double) (string - below.getKey()) / strings;
    return below.getValue() + share * (above.getValue() - below.getValue());
  }
}
