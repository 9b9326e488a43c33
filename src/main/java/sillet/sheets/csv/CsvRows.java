package sillet.sheets.csv;

import com.opencsv.RFC4180Parser;
import com.opencsv.RFC4180ParserBuilder;
import java.io.IOException;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/**
 * The rows of a file, one after the other; never more than one of them is held. Blank rows are left
 * out. A row that cannot be read is reported and passed over.
 */
public final class CsvRows {
  private final Lines lines;
  private final char separator;
  private final RFC4180Parser parser;
  private final Remarks refusals;

  CsvRows(Lines lines, char separator, Remarks refusals) {
    this.lines = lines;
    this.separator = separator;
    this.parser = new RFC4180ParserBuilder().withSeparator(separator).build();
    this.refusals = refusals;
  }

  /**
   * The next row that is not blank.
   *
   * @return the row, or null after the last one
   * @throws Unreadable if the rest of the file makes no sense
   */
  public @Nullable CsvRow next() throws Unreadable {
    try {
      CsvRow row = read();
      while (row != null && row.size() == 0) {
        row = read();
      }
      return row;
    } catch (IOException broken) {
      throw new Unreadable(
          new Remark(
              Place.line(lines.number()),
              Message.of("file.unreadable", String.valueOf(broken.getMessage()))));
    }
  }

  private @Nullable CsvRow read() throws IOException, Unreadable {
    String line = lines.next();
    if (line == null) {
      return null;
    }
    if (lines.tooLong()) {
      return refused(
          Place.line(lines.number()), Message.of("sheet.line-too-long", Lines.longest()));
    }
    return line.indexOf(Quoting.MARK) < 0
        ? new CsvRow(parser.parseLine(line), lines.number(), null)
        : quoted(line);
  }

  private CsvRow quoted(String line) throws IOException, Unreadable {
    Quoting quoting = new Quoting(separator);
    long first = lines.number();
    long opened = first;
    StringBuilder row = new StringBuilder(line);
    int wrong = quoting.follow(line, first);
    while (wrong == 0 && quoting.open()) {
      String more = lines.next();
      if (more == null || row.length() + more.length() >= Lines.LONGEST) {
        throw neverClosed(opened, quoting.openedAt());
      }
      row.append('\n').append(more);
      int before = quoting.openedAt();
      wrong = quoting.follow(more, lines.number());
      opened = before == quoting.openedAt() ? opened : lines.number();
    }
    if (wrong > 0) {
      return refused(Place.character(lines.number(), wrong), Message.of("sheet.stray-quote"));
    }
    return new CsvRow(parser.parseLine(row.toString()), first, quoting.cellLines());
  }

  private static Unreadable neverClosed(long line, int character) {
    return new Unreadable(
        new Remark(
            Place.character(line, character), Message.of("sheet.quote-open", Lines.longest())));
  }

  /** Reports a row and passes over it as if it were blank. */
  private CsvRow refused(Place place, Message why) {
    refusals.add(place, why);
    return new CsvRow(new String[0], lines.number(), null);
  }
}
