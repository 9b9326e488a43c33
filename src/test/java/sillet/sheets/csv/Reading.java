package sillet.sheets.csv;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Reads bytes as a sheet, for tests: the rows, and all that was said of them. */
final class Reading {
  final List<List<String>> rows = new ArrayList<>();
  final List<CsvRow> raw = new ArrayList<>();
  final List<Remark> said = new ArrayList<>();

  private Reading() {}

  static Reading of(Path folder, String text) throws IOException {
    return of(folder, text.getBytes(StandardCharsets.UTF_8));
  }

  static Reading of(Path folder, String text, Charset charset) throws IOException {
    return of(folder, text.getBytes(charset));
  }

  static Reading of(Path folder, byte[] bytes) throws IOException {
    Path path = Files.write(folder.resolve("sheet.csv"), bytes);
    Reading reading = new Reading();
    Remarks remarks = new Remarks();
    Remark end = null;
    try (SheetFile file = SheetFile.open(path)) {
      CsvRows rows = file.rows(remarks);
      for (CsvRow row = rows.next(); row != null; row = rows.next()) {
        reading.take(row);
      }
    } catch (Unreadable unreadable) {
      end = unreadable.reason();
    }
    reading.said.addAll(remarks.listed());
    if (end != null) {
      reading.said.add(end);
    }
    return reading;
  }

  private void take(CsvRow row) {
    raw.add(row);
    List<String> cells = new ArrayList<>();
    for (int i = 0; i < row.size(); i++) {
      cells.add(row.cell(i));
    }
    rows.add(cells);
  }

  List<String> keys() {
    return said.stream().map(remark -> remark.message().key()).toList();
  }
}
