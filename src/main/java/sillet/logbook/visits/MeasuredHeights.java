package sillet.logbook.visits;

import java.util.List;
import java.util.NavigableMap;
import java.util.TreeMap;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;

/**
 * What was really measured: of each thing the newest figure, nothing estimated between strings.
 * Figures made otherwise, or at another fret, are not compared and so do not count.
 */
public final class MeasuredHeights {
  private static final int OCTAVE = 12;

  private MeasuredHeights() {}

  /**
   * The gap over fret 12 of an open string.
   *
   * @param checks in the order they were made
   * @param string number
   * @param moment as received or as left
   * @return millimetres; null if it was not measured
   */
  public static @Nullable Double action12Mm(List<BenchCheck> checks, int string, Moment moment) {
    return byString(at(moment, checks), CheckKind.ACTION).get(string);
  }

  /**
   * The relief by straightedge: under this string, or of the neck as a whole.
   *
   * @param checks in the order they were made
   * @param string number
   * @param moment as received or as left
   * @return millimetres; null if it was not measured
   */
  public static @Nullable Double reliefMm(List<BenchCheck> checks, int string, Moment moment) {
    NavigableMap<Integer, Double> measured = byString(at(moment, checks), CheckKind.RELIEF);
    Double own = measured.get(string);
    return own == null ? measured.get(BenchCheck.WHOLE_NECK) : own;
  }

  /** The newest figure of each string; a string whose newest one is not comparable has none. */
  static NavigableMap<Integer, Double> byString(List<BenchCheck> checks, CheckKind kind) {
    NavigableMap<Integer, BenchCheck> newest = new TreeMap<>();
    checks.stream().filter(c -> c.kind() == kind).forEach(c -> newest.put(c.string(), c));
    NavigableMap<Integer, Double> measured = new TreeMap<>();
    newest.values().stream()
        .filter(comparable(kind))
        .forEach(c -> measured.put(c.string(), c.valueMm()));
    return measured;
  }

  private static Predicate<BenchCheck> comparable(CheckKind kind) {
    return switch (kind) {
      case ACTION -> c -> c.method() == CheckMethod.OPEN && c.fret() == OCTAVE;
      case FIRST_FRET_CLEARANCE -> c -> c.method() == CheckMethod.OPEN;
      case RELIEF -> c -> c.method() == CheckMethod.STRAIGHTEDGE;
      case PICKUP_HEIGHT, SADDLE_HEIGHT -> c -> true;
    };
  }

  private static List<BenchCheck> at(Moment moment, List<BenchCheck> checks) {
    return checks.stream().filter(c -> c.moment() == moment).toList();
  }
}
