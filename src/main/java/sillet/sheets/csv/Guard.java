package sillet.sheets.csv;

/**
 * Text that a spreadsheet would take for a formula (CWE-1236). Such a cell gets a leading
 * apostrophe, which comes off again when the cell is read here. Numbers are never touched: a
 * negative one begins with a minus by right.
 */
public final class Guard {
  private static final char APOSTROPHE = '\'';
  private static final String DANGEROUS = "=+-@\t\r\n\0";

  private Guard() {}

  /** Makes a text harmless. */
  public static String on(String text) {
    return dangerousAfter(text, apostrophes(text)) ? APOSTROPHE + text : text;
  }

  /** Takes off what {@link #on} has put there, and nothing else. */
  public static String off(String cell) {
    int apostrophes = apostrophes(cell);
    return apostrophes > 0 && dangerousAfter(cell, apostrophes) ? cell.substring(1) : cell;
  }

  /** Apostrophes of the text's own count too, or taking one off would eat them. */
  private static int apostrophes(String text) {
    int count = 0;
    while (count < text.length() && text.charAt(count) == APOSTROPHE) {
      count++;
    }
    return count;
  }

  private static boolean dangerousAfter(String text, int start) {
    return start < text.length() && DANGEROUS.indexOf(text.charAt(start)) >= 0;
  }
}
