package sillet.sheets.bench;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.stream.IntStream;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.sheets.csv.CsvRow;
import sillet.sheets.csv.Place;
import sillet.sheets.csv.Remarks;

/** Which column stands where. */
final class Header {
  private final Map<String, Integer> places = new HashMap<>();
  private final CsvRow row;
  private final SheetUse use;

  private Header(CsvRow row, SheetUse use) {
    this.row = row;
    this.use = use;
  }

  /** Reads the header; what is wrong with it goes to the refusals, what is known can be used. */
  static Header of(CsvRow row, SheetUse use, Remarks refusals) {
    Header header = new Header(row, use);
    if (header.isNone()) {
      String key = row.cell(0).indexOf('\t') < 0 ? "bench.no-header" : "bench.tabs";
      refusals.add(
          Place.line(row.line()),
          Message.of(key, Quoted.of(row.cell(0)), String.join(",", Columns.REQUIRED)));
      return header;
    }
    for (int i = 0; i < row.size(); i++) {
      header.take(i, refusals);
    }
    Columns.REQUIRED.stream()
        .filter(name -> !header.has(name))
        .forEach(
            name -> refusals.add(Place.line(row.line()), Message.of("bench.column-missing", name)));
    if (use == SheetUse.MOVES
        && IntStream.rangeClosed(1, Columns.FRETS).mapToObj(Columns::fret).noneMatch(header::has)) {
      refusals.add(Place.line(row.line()), Message.of("bench.no-fret-column"));
    }
    return header;
  }

  /** Tells whether the first row names no column at all, so that it cannot be a header. */
  boolean isNone() {
    return IntStream.range(0, row.size()).noneMatch(i -> Columns.KNOWN.contains(name(i)));
  }

  boolean has(String name) {
    return places.containsKey(name);
  }

  /** Where a column stands, from 0; -1 if the sheet does not have it. */
  int index(String name) {
    return places.getOrDefault(name, -1);
  }

  /** What stands over a column, as written; empty beyond the header's end. */
  String written(int index) {
    return row.cell(index);
  }

  /** The place of a column in some line. */
  Place place(long line, String name) {
    return Place.cell(line, index(name) + 1L, written(index(name)));
  }

  /** What the sheet is read for. */
  SheetUse use() {
    return use;
  }

  boolean isJobSheet() {
    return has(Columns.PASS);
  }

  private void take(int index, Remarks refusals) {
    String name = name(index);
    Place place = row.place(index, written(index));
    if (name.isEmpty()) {
      return;
    }
    if (!Columns.KNOWN.contains(name)) {
      refusals.add(
          place,
          Message.of(
              "bench.column-unknown", Quoted.of(written(index)), Nearest.of(name, Columns.KNOWN)));
    } else if (has(name)) {
      refusals.add(
          place,
          Message.of(
              "bench.column-twice", name, String.format(Locale.ROOT, "%d", index(name) + 1)));
    } else {
      places.put(name, index);
    }
  }

  private String name(int index) {
    return written(index).toLowerCase(Locale.ROOT);
  }
}
