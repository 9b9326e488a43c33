package sillet.desktop.drawing.strings;

/**
 * A finding that still needs a hand, with a leader to its place on the drawing. One that was dealt
 * with is not drawn.
 *
 * @param number the number in its balloon
 * @param row the string, counted from 0 in the order of the rows, or {@link #ALL_STRINGS}
 * @param fret the fret it shows at, 0 for the nut, {@link #AT_SADDLE} or {@link #ON_STRING}
 * @param says its name, for screen readers
 */
public record FindingMark(int number, int row, int fret, String says) {
  /** The finding shows at the saddle. */
  public static final int AT_SADDLE = -1;

  /** The finding is the string itself. */
  public static final int ON_STRING = -2;

  /** The finding is about a fret, or the nut, under all strings. */
  public static final int ALL_STRINGS = -1;
}
