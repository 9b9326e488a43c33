package sillet.sheets.csv;

import java.util.List;

/**
 * Comma or semicolon, found out from the first lines of a file. The header decides, since no column
 * name holds either; where it cannot, all lines together do.
 */
final class Separator {
  static final char COMMA = ',';
  static final char SEMICOLON = ';';

  /** So many lines are looked at. */
  static final int LINES = 20;

  private Separator() {}

  static char of(List<String> firstLines) {
    int lead = 0;
    int header = 0;
    for (String line : firstLines) {
      int commas = Quoting.separators(line, COMMA);
      int semicolons = Quoting.separators(line, SEMICOLON);
      lead += commas - semicolons;
      if (header == 0) {
        header = commas - semicolons;
      }
    }
    return (header == 0 ? lead : header) < 0 ? SEMICOLON : COMMA;
  }
}
