package sillet.sheets.csv;

import java.util.Arrays;

/**
 * Follows the quotation marks of one row, line by line. The parser behind it forgives a mark at a
 * wrong place by swallowing the cells that follow; here such a row is found before it gets there.
 */
final class Quoting {
  static final char MARK = '"';

  private enum Now {
    BEFORE,
    PLAIN,
    INSIDE,
    CLOSED
  }

  private final char separator;
  private Now now = Now.BEFORE;
  private long[] cellLines = new long[64];
  private int cells;
  private int openedAt;

  Quoting(char separator) {
    this.separator = separator;
  }

  /**
   * Follows one more line of the row.
   *
   * @return the place of a mark where none may stand, from 1, or 0
   */
  int follow(String text, long line) {
    if (cells == 0) {
      begin(line);
    }
    for (int i = 0; i < text.length(); i++) {
      if (wrong(text.charAt(i), line, i + 1)) {
        return i + 1;
      }
    }
    return 0;
  }

  private boolean wrong(char c, long line, int place) {
    switch (now) {
      case INSIDE -> now = c == MARK ? Now.CLOSED : Now.INSIDE;
      case CLOSED -> {
        // a second mark at once is one that was doubled
        if (c == MARK) {
          now = Now.INSIDE;
        } else {
          return c != separator || begin(line);
        }
      }
      case BEFORE, PLAIN -> {
        if (c == separator) {
          return begin(line);
        }
        if (c == MARK && now == Now.PLAIN) {
          return true;
        }
        openedAt = c == MARK ? place : openedAt;
        now = c == MARK ? Now.INSIDE : Now.PLAIN;
      }
    }
    return false;
  }

  private boolean begin(long line) {
    if (cells == cellLines.length) {
      cellLines = Arrays.copyOf(cellLines, 2 * cells);
    }
    cellLines[cells++] = line;
    now = Now.BEFORE;
    return false;
  }

  /** Whether the row goes on in the next line. */
  boolean open() {
    return now == Now.INSIDE;
  }

  /** Where in its line the quoted cell that is open began, from 1. */
  int openedAt() {
    return openedAt;
  }

  /** The line each cell begins in. */
  long[] cellLines() {
    return Arrays.copyOf(cellLines, cells);
  }

  /** How often a separator stands outside quotation marks. */
  static int separators(String line, char separator) {
    Quoting quoting = new Quoting(separator);
    quoting.follow(line, 1);
    return quoting.cells - 1;
  }
}
