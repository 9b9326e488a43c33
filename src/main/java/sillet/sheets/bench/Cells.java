package sillet.sheets.bench;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.DecimalText;
import sillet.sheets.csv.CsvRow;
import sillet.sheets.csv.Guard;
import sillet.sheets.csv.Place;
import sillet.sheets.csv.Remarks;

/**
 * One row, asked by the names of its columns. A cell that cannot be taken is refused once and then
 * counts as blank, so that the rest of the row is looked at too.
 */
final class Cells {
  private final CsvRow row;
  private final Header header;
  private final Remarks refusals;
  private final Remarks warnings;
  private boolean refused;

  Cells(CsvRow row, Header header, Remarks refusals, Remarks warnings) {
    this.row = row;
    this.header = header;
    this.refusals = refusals;
    this.warnings = warnings;
  }

  /** Whether anything in this row was refused. */
  boolean refused() {
    return refused;
  }

  long line() {
    return row.line();
  }

  /**
   * What stands in a cell, without a guard a spreadsheet needed; blank if there is no such column.
   */
  String text(String name) {
    int index = header.index(name);
    return index < 0 ? "" : Guard.off(row.cell(index));
  }

  /** What stands in a cell that must not be blank; null if it is, which is refused. */
  @Nullable String filled(String name) {
    String text = text(name);
    if (!text.isEmpty()) {
      return text;
    }
    // a column that is missing altogether is reported once, with the header
    if (header.has(name)) {
      refuse(name, Message.of("bench.cell-blank"));
    }
    refused = true;
    return null;
  }

  /** A number; null if the cell is blank or no number. */
  @Nullable Double number(String name) {
    String text = text(name);
    if (text.isEmpty()) {
      return null;
    }
    try {
      return DecimalText.parse(text).value();
    } catch (Rejection rejection) {
      refuse(name, rejection.reason());
      return null;
    }
  }

  /** A number that has to be above zero; null if the cell is blank or refused. */
  @Nullable Double aboveZero(String name) {
    Double value = number(name);
    if (value != null && value <= 0) {
      refuse(name, Message.of("bench.not-above-zero", Quoted.of(text(name))));
      return null;
    }
    return value;
  }

  /** A number that may not be below zero; null if the cell is blank or refused. */
  @Nullable Double notBelowZero(String name) {
    Double value = number(name);
    if (value != null && value < 0) {
      refuse(name, Message.of("bench.below-zero", Quoted.of(text(name))));
      return null;
    }
    return value;
  }

  void refuse(String name, Message why) {
    refused = true;
    refusals.add(place(name), why);
  }

  void warn(String name, Optional<Message> unusual) {
    unusual.ifPresent(message -> warnings.add(place(name), message));
  }

  /** Refuses what stands beyond the header or under a column without a name. */
  void refuseUnnamed() {
    for (int i = 0; i < row.size(); i++) {
      if (header.written(i).isEmpty() && !row.cell(i).isEmpty()) {
        refused = true;
        refusals.add(row.place(i, ""), Message.of("bench.cell-unnamed", Quoted.of(row.cell(i))));
      }
    }
  }

  private Place place(String name) {
    int index = header.index(name);
    return row.place(index, header.written(index));
  }
}
