package sillet.sheets.csv;

import com.opencsv.CSVWriter;
import com.opencsv.ICSVWriter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.Writer;
import java.util.List;

/**
 * Writes rows: comma, dot, a line feed at the end of each row. The CSV library keeps a failed write
 * to itself, so it writes into memory and the row goes on from there.
 */
public final class CsvOut {
  private final Writer out;
  private final StringWriter row = new StringWriter();
  private final ICSVWriter csv =
      new CSVWriter(
          row,
          Separator.COMMA,
          ICSVWriter.DEFAULT_QUOTE_CHARACTER,
          ICSVWriter.DEFAULT_QUOTE_CHARACTER,
          "\n");

  public CsvOut(Writer out) {
    this.out = out;
  }

  /** Writes the names of the columns. */
  public void header(List<String> names) throws IOException {
    write(names.toArray(String[]::new));
  }

  /** Writes a row. */
  public void line(CsvLine line) throws IOException {
    write(line.cells());
  }

  private void write(String[] cells) throws IOException {
    row.getBuffer().setLength(0);
    csv.writeNext(cells, false);
    out.append(row.getBuffer());
  }
}
