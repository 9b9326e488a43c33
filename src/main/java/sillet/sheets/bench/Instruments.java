package sillet.sheets.bench;

import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.sheets.csv.Remarks;

/** Keeps an eye on instruments: whose rows do not stand together, and which were never read. */
final class Instruments {
  private static final int FEWEST_TO_TELL = 3;
  private static final int SKIPPED = 2;

  private final Set<Long> seen = new HashSet<>();
  private final Set<Long> scattered = new HashSet<>();
  private final Map<Long, Unread> unread = new HashMap<>();
  private final Map<Long, Numbering> numbers = new HashMap<>();
  private long current;
  private boolean any;

  private record Unread(long line, String name) {}

  /** How many strings an instrument has in the sheet, and the row of the highest number. */
  private record Numbering(int strings, int highest, long line) {
    Numbering with(BenchRow row) {
      int number = row.string().string().number();
      return number > highest
          ? new Numbering(strings + 1, number, row.line())
          : new Numbering(strings + 1, highest, line);
    }

    /** Outer strings alone are often read; a number far beyond all the others is a slip. */
    boolean odd() {
      return strings >= FEWEST_TO_TELL && highest > strings + SKIPPED;
    }
  }

  void take(BenchRow row) {
    if (!any || row.instrument() != current) {
      any = true;
      current = row.instrument();
      if (seen.add(current)) {
        unread.put(current, new Unread(row.line(), Quoted.of(row.string().instrument())));
      } else {
        scattered.add(current);
      }
    }
    if (row.isRead()) {
      unread.remove(current);
    }
  }

  /** Counts a string that has not stood in the sheet before. */
  void count(BenchRow row) {
    Numbering before = numbers.getOrDefault(row.instrument(), new Numbering(0, 0, 0));
    numbers.put(row.instrument(), before.with(row));
  }

  void warnOfOddNumbers(Remarks warnings, Header header) {
    numbers.values().stream()
        .filter(Numbering::odd)
        .sorted(Comparator.comparingLong(Numbering::line))
        .forEach(
            one ->
                warnings.add(
                    header.place(one.line(), Columns.STRING),
                    Message.of(
                        "bench.string-odd",
                        Integer.toString(one.highest()),
                        Integer.toString(one.strings()))));
  }

  /** The instruments whose rows do not stand together. */
  Set<Long> scattered() {
    return Set.copyOf(scattered);
  }

  void refuseUnread(Remarks refusals, Header header) {
    unread.values().stream()
        .sorted(Comparator.comparingLong(Unread::line))
        .forEach(
            one ->
                refusals.add(
                    header.place(one.line(), Columns.INSTRUMENT),
                    Message.of("bench.instrument-unread", one.name())));
  }
}
