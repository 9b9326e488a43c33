package sillet.sheets.csv;

import org.jspecify.annotations.Nullable;

/** One row of a file: its cells and where each of them begins. */
public final class CsvRow {
  private final String[] cells;
  private final long line;
  private final long @Nullable [] cellLines;
  private final int size;

  /**
   * A row.
   *
   * @param cells the cells, unquoted
   * @param line where the row begins
   * @param cellLines where each cell begins, null if all begin in the row's own line
   */
  CsvRow(String[] cells, long line, long @Nullable [] cellLines) {
    this.cells = cells;
    this.line = line;
    this.cellLines = cellLines;
    int filled = cells.length;
    while (filled > 0 && cells[filled - 1].isBlank()) {
      filled--;
    }
    this.size = filled;
  }

  /** How many cells there are, blank ones at the end left out. */
  public int size() {
    return size;
  }

  /** The line the row begins in. */
  public long line() {
    return line;
  }

  /**
   * What stands in a cell, without space around it.
   *
   * @param index from 0; beyond the row's end a cell is blank
   */
  public String cell(int index) {
    return index < size ? cells[index].strip() : "";
  }

  /** Where a cell stands. */
  public Place place(int index, String header) {
    long at = cellLines != null && index < cellLines.length ? cellLines[index] : line;
    return Place.cell(at, index + 1L, header);
  }
}
