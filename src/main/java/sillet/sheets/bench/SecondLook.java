package sillet.sheets.bench;

import java.io.IOException;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import sillet.sheets.csv.CsvRow;
import sillet.sheets.csv.CsvRows;
import sillet.sheets.csv.Remarks;
import sillet.sheets.csv.SheetFile;
import sillet.sheets.csv.SheetRefused;
import sillet.sheets.csv.Unreadable;

/** Reads a sheet again that was found right, and makes something of each string. */
final class SecondLook<T> {
  private final SheetFile file;
  private final Survey survey;
  private final Function<List<SheetString>, List<T>> reckon;
  private final List<SheetString> together = new ArrayList<>();
  private final Map<Long, Deque<T>> scattered = new HashMap<>();

  @FunctionalInterface
  private interface RowTaker {
    void take(BenchRow row) throws IOException;
  }

  SecondLook(SheetFile file, Survey survey, Function<List<SheetString>, List<T>> reckon) {
    this.file = file;
    this.survey = survey;
    this.reckon = reckon;
  }

  void handTo(BenchSheet.Taker<T> taker) throws IOException {
    if (!survey.scattered().isEmpty()) {
      gather();
    }
    long[] current = {0};
    eachRow(
        row -> {
          if (row.instrument() != current[0]) {
            finish(taker);
            current[0] = row.instrument();
          }
          Deque<T> gathered = scattered.get(row.instrument());
          if (gathered == null) {
            together.add(row.said());
          } else {
            taker.take(gathered.remove());
          }
        });
    finish(taker);
  }

  private void gather() throws IOException {
    Map<Long, List<SheetString>> held = new HashMap<>();
    eachRow(
        row -> {
          if (survey.scattered().contains(row.instrument())) {
            held.computeIfAbsent(row.instrument(), i -> new ArrayList<>()).add(row.said());
          }
        });
    held.forEach((instrument, strings) -> scattered.put(instrument, reckoned(strings)));
  }

  private void finish(BenchSheet.Taker<T> taker) throws IOException {
    for (T one : reckoned(together)) {
      taker.take(one);
    }
    together.clear();
  }

  private Deque<T> reckoned(List<SheetString> strings) {
    if (strings.isEmpty()) {
      return new ArrayDeque<>();
    }
    List<T> results = reckon.apply(List.copyOf(strings));
    if (results.size() != strings.size()) {
      throw new IllegalStateException(results.size() + " results of " + strings.size());
    }
    return new ArrayDeque<>(results);
  }

  private void eachRow(RowTaker taker) throws IOException {
    Remarks wrong = new Remarks();
    Remarks unusual = new Remarks();
    try {
      CsvRows rows = file.rows(wrong);
      CsvRow first = rows.next();
      if (first == null) {
        throw changed();
      }
      Header header = Header.of(first, survey.use(), wrong);
      for (CsvRow row = rows.next(); row != null; row = rows.next()) {
        BenchRow read = BenchRow.read(row, header, wrong, unusual);
        if (read == null) {
          throw changed();
        }
        if (survey.counts(read)) {
          taker.take(read);
        }
      }
      if (wrong.any()) {
        throw changed();
      }
    } catch (Unreadable unreadable) {
      throw changed();
    }
  }

  /** It was right a moment ago. */
  private static SheetRefused changed() {
    return SheetRefused.file("file.changed");
  }
}
