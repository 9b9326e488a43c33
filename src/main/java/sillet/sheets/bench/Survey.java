package sillet.sheets.bench;

import java.util.Locale;
import java.util.Set;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.sheets.csv.CsvRow;
import sillet.sheets.csv.CsvRows;
import sillet.sheets.csv.Place;
import sillet.sheets.csv.Remarks;
import sillet.sheets.csv.SheetFile;
import sillet.sheets.csv.SheetRefused;
import sillet.sheets.csv.Unreadable;

/** The first look through a sheet: is it right, and where do its rows stand. */
final class Survey {
  private final Remarks refusals = new Remarks();
  private final Remarks warnings = new Remarks();
  private final StringIndex strings = new StringIndex();
  private final Instruments instruments = new Instruments();

  private final SheetUse use;

  private Survey(SheetUse use) {
    this.use = use;
  }

  /**
   * Looks through a sheet.
   *
   * @throws SheetRefused with everything that is wrong
   */
  static Survey of(SheetFile file, SheetUse use) {
    Survey survey = new Survey(use);
    try {
      survey.look(file.rows(survey.refusals));
    } catch (Unreadable unreadable) {
      survey.refusals.add(unreadable.reason());
    }
    if (survey.refusals.any()) {
      throw new SheetRefused(survey.refusals);
    }
    return survey;
  }

  SheetUse use() {
    return use;
  }

  Remarks warnings() {
    return warnings;
  }

  Set<Long> scattered() {
    return instruments.scattered();
  }

  /** Tells whether this is the row that counts for its string. */
  boolean counts(BenchRow row) {
    return strings.line(row.stringOnInstrument()) == row.line();
  }

  private void look(CsvRows rows) throws Unreadable {
    CsvRow first = rows.next();
    if (first == null) {
      // a line that could not be taken was there all the same
      if (!refusals.any()) {
        refusals.add(Place.file(), Message.of("bench.empty"));
      }
      return;
    }
    Header header = Header.of(first, use, refusals);
    if (header.isNone()) {
      return;
    }
    boolean any = false;
    for (CsvRow row = rows.next(); row != null; row = rows.next()) {
      any = true;
      BenchRow read = BenchRow.read(row, header, refusals, warnings);
      if (read != null) {
        take(read, header);
      }
    }
    if (!any && !refusals.any()) {
      refusals.add(Place.line(first.line()), Message.of("bench.no-row"));
    }
    instruments.warnOfOddNumbers(warnings, header);
    if (use == SheetUse.MOVES && !refusals.any()) {
      instruments.refuseUnread(refusals, header);
    }
  }

  private void take(BenchRow row, Header header) {
    instruments.take(row);
    long key = row.stringOnInstrument();
    long before = strings.line(key);
    int rank = before == 0 ? -1 : strings.rank(key);
    boolean bothUnread = row.rank() == 0 && rank == 0;
    if (before == 0) {
      instruments.count(row);
    }
    if (row.rank() > rank || bothUnread) {
      strings.put(key, row.line(), row.rank());
    } else if (row.rank() == rank) {
      refuseTwice(row, before, header);
    }
  }

  private void refuseTwice(BenchRow row, long before, Header header) {
    refusals.add(
        header.place(row.line(), Columns.STRING),
        Message.of(
            "bench.string-twice",
            Integer.toString(row.string().string().number()),
            Quoted.of(row.string().instrument()),
            String.format(Locale.ROOT, "%d", before)));
  }
}
