package sillet.desktop.visit.readings;

/** What the cells tell the page, and what they ask it. */
public interface GridHand {
  /** What a cell shows. */
  CellFace face(Cell cell);

  /** A cell has the focus now. */
  void entered(Cell cell);

  /** Something else stands in a cell. */
  void typed(Cell cell, String text);

  /** The last try goes up or down by tenths of a cent. */
  void stepped(Cell cell, int tenths);

  /** The focus left a cell, or its reading is done. */
  void done(Cell cell);

  /**
   * The hand goes on.
   *
   * @return whether there was a cell to go to
   */
  boolean go(Cell from, Way way);
}
