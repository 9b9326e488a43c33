package sillet.desktop.drawing.strings;

/**
 * A finding that still needs a hand, with a leader to its place on the drawing. One that was dealt
 * with is not drawn.
 *
 * @param number the number in its balloon
 * @param row the string, counted from 0 in the order of the rows
 * @param fret the read fret it shows at, or {@link #AT_SADDLE}
 * @param says its name, for screen readers
 */
public record FindingMark(int number, int row, int fret, String says) {
  /** The finding shows at the saddle. */
  public static final int AT_SADDLE = -1;
}
