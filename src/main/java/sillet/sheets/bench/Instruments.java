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
  private final Set<Long> seen = new HashSet<>();
  private final Set<Long> scattered = new HashSet<>();
  private final Map<Long, Unread> unread = new HashMap<>();
  private long current;
  private boolean any;

  private record Unread(long line, String name) {}

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
