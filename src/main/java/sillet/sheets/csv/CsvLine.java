package sillet.sheets.csv;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.units.Figures;

/** A row on its way out: each cell says what it is, because text is guarded and figures are not. */
public final class CsvLine {
  private static final int MEASURED_DECIMALS = 4;

  private final List<String> cells = new ArrayList<>();

  /** What people have written. */
  public CsvLine text(String text) {
    return add(Guard.on(oneLine(text)));
  }

  /** A word of the file's own vocabulary, a date, or a reading. */
  public CsvLine word(String word) {
    return add(word);
  }

  /** A figure with so many decimals, blank if it is not known. */
  public CsvLine figure(@Nullable Double value, int decimals) {
    return add(value == null ? "" : Figures.fixed(value, decimals));
  }

  /** A figure as it was measured, without zeros at its end, blank if it is not known. */
  public CsvLine measure(@Nullable Double value) {
    return add(value == null ? "" : measured(value));
  }

  private static String measured(double value) {
    String text = Figures.fixed(value, MEASURED_DECIMALS);
    int end = text.length();
    while (text.charAt(end - 1) == '0') {
      end--;
    }
    return text.substring(0, text.charAt(end - 1) == '.' ? end - 1 : end);
  }

  /** A count or a number on something, blank if there is none. */
  public CsvLine count(@Nullable Integer value) {
    return add(value == null ? "" : Integer.toString(value));
  }

  public CsvLine blank() {
    return add("");
  }

  private CsvLine add(String cell) {
    cells.add(cell);
    return this;
  }

  String[] cells() {
    return cells.toArray(String[]::new);
  }

  /** A line break or another control character would tear the row apart: it becomes a space. */
  private static String oneLine(String text) {
    StringBuilder folded = new StringBuilder(text.length());
    text.codePoints().map(point -> breaks(point) ? ' ' : point).forEach(folded::appendCodePoint);
    return folded.toString().strip();
  }

  private static boolean breaks(int point) {
    return Character.isISOControl(point) || point == '\u2028' || point == '\u2029';
  }
}
