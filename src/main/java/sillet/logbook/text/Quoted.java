package sillet.logbook.text;

import java.util.Locale;

/**
 * What was read, fit to be repeated in a sentence: short, on one line, with control characters made
 * visible.
 */
public final class Quoted {
  private static final int LONGEST = 40;

  private Quoted() {}

  /**
   * Repeats what was read, at most 40 characters of it.
   *
   * @param text anything, also hostile
   * @return a short printable form, without quotation marks
   */
  public static String of(String text) {
    StringBuilder shown = new StringBuilder();
    int length = text.length();
    for (int i = 0, taken = 0; i < length && taken < LONGEST; taken++) {
      int point = text.codePointAt(i);
      shown.append(visible(point));
      i += Character.charCount(point);
    }
    return text.codePointCount(0, length) > LONGEST ? shown + "..." : shown.toString();
  }

  private static String visible(int point) {
    int type = Character.getType(point);
    boolean hidden =
        Character.isISOControl(point)
            || type == Character.FORMAT
            || type == Character.SURROGATE
            || type == Character.LINE_SEPARATOR
            || type == Character.PARAGRAPH_SEPARATOR
            || type == Character.UNASSIGNED;
    return hidden ? String.format(Locale.ROOT, "\\u%04x", point) : Character.toString(point);
  }
}
