package sillet.sheets.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import sillet.logbook.moves.BenchString;
import sillet.sheets.csv.Place;
import sillet.sheets.csv.Remark;
import sillet.sheets.csv.SheetRefused;

/** Makes and reads bench sheets for tests. */
final class Sheets {
  static final String HEADER = "instrument,string,pitch,scale_mm,gauge_in,construction,f12";
  static final String ROW = "Demo,1,E4,648,0.010,plain-steel,5.0";

  private Sheets() {}

  /** A sheet of one good row in which one cell is changed or added. */
  static String with(String column, String cell) {
    Map<String, String> row = new LinkedHashMap<>();
    String[] names = HEADER.split(",", -1);
    String[] cells = ROW.split(",", -1);
    for (int i = 0; i < names.length; i++) {
      row.put(names[i], cells[i]);
    }
    row.put(column, cell);
    return String.join(",", row.keySet())
        + "\n"
        + row.values().stream().map(c -> '"' + c + '"').collect(Collectors.joining(","))
        + "\n";
  }

  static List<BenchString> read(Path folder, String sheet) throws IOException {
    List<BenchString> strings = new ArrayList<>();
    try (BenchSheet bench = BenchSheet.open(write(folder, sheet), SheetUse.MOVES)) {
      bench.inOrder(one -> one, row -> strings.add(row.string()));
    }
    return strings;
  }

  /** The groups a sheet is reckoned in, and the order in which its strings come out. */
  static List<List<String>> groups(Path folder, String sheet, List<String> order)
      throws IOException {
    List<List<String>> groups = new ArrayList<>();
    try (BenchSheet bench = BenchSheet.open(write(folder, sheet), SheetUse.MOVES)) {
      bench.inOrder(
          one -> {
            groups.add(one.stream().map(Sheets::name).toList());
            return one;
          },
          string -> order.add(name(string)));
    }
    return groups;
  }

  private static String name(SheetString row) {
    return row.string().instrument() + row.string().string().number();
  }

  /** What a sheet is refused for; empty if it is taken. */
  static List<Remark> refusals(Path folder, String sheet) throws IOException {
    try {
      BenchSheet.open(write(folder, sheet), SheetUse.MOVES).close();
      return List.of();
    } catch (SheetRefused refused) {
      return refused.reasons();
    }
  }

  static List<Remark> warnings(Path folder, String sheet) throws IOException {
    try (BenchSheet bench = BenchSheet.open(write(folder, sheet), SheetUse.MOVES)) {
      return bench.warnings().listed();
    }
  }

  /** Place and key in one line, as {@code 2:3 key}. */
  static String brief(Remark remark) {
    Place place = remark.place();
    return place.line() + ":" + place.column() + " " + remark.message().key();
  }

  static Path write(Path folder, String sheet) throws IOException {
    return Files.writeString(folder.resolve("bench.csv"), sheet);
  }
}
