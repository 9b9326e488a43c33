package sillet.logbook.visits;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.TreeMap;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.Heights;

/**
 * How high each string lies, from the checks of a visit. Often only the outer strings are measured;
 * those between lie on a line, as the strings follow the board.
 */
final class StringHeights {
  private static final int OCTAVE = 12;

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
        along(string, CheckKind.ACTION, c -> open(c) && c.fret() == OCTAVE),
        along(string, CheckKind.FIRST_FRET_CLEARANCE, StringHeights::open),
        along(string, CheckKind.RELIEF, c -> c.method() == CheckMethod.STRAIGHTEDGE));
  }

  private static boolean open(BenchCheck check) {
    return check.method() == CheckMethod.OPEN;
  }

  /**
   * The newest check of each string counts; one made at another fret or otherwise tells nothing.
   */
  private @Nullable Double along(int string, CheckKind kind, Predicate<BenchCheck> comparable) {
    NavigableMap<Integer, BenchCheck> newest = new TreeMap<>();
    checks.stream().filter(c -> c.kind() == kind).forEach(c -> newest.put(c.string(), c));
    NavigableMap<Integer, Double> measured = new TreeMap<>();
    newest.values().stream().filter(comparable).forEach(c -> measured.put(c.string(), c.valueMm()));
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
