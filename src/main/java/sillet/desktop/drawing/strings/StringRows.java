package sillet.desktop.drawing.strings;

/** Where the rows lie, top to bottom, in px. Holds no JavaFX types. */
public final class StringRows {
  private static final double EDGE_EM = 1.5;
  private static final double TIGHT_EDGE_EM = 1.29;

  private final double[] ys;
  private final double top;
  private final double bottom;
  private final double rowPx;

  /**
   * Rows below a given height.
   *
   * @param picture the strings
   * @param measures row height and gaps
   * @param top upper edge of the board, px
   * @param em px of one em
   */
  public StringRows(StringsPicture picture, SheetMeasures measures, double top, double em) {
    int count = picture.rows().size();
    double edge = em * (measures.tight() ? TIGHT_EDGE_EM : EDGE_EM);
    this.rowPx = em * measures.row();
    this.top = top;
    double[] down = new double[count];
    double y = top + edge;
    for (int i = 0; i < count; i++) {
      int row = picture.lie().stringOneBelow() ? count - 1 - i : i;
      if (i > 0) {
        int lower = picture.lie().stringOneBelow() ? row + 1 : row;
        boolean pair = !picture.hasCourses() || picture.closeToTheOneBefore(lower);
        y += rowPx + (pair ? 0 : em * measures.courseGap());
      }
      down[row] = Math.floor(y) + 0.5;
    }
    this.ys = down;
    this.bottom = y + edge;
  }

  /** The middle of a string's row, on the middle of a pixel. Rows count from 0, string 1 first. */
  public double y(int row) {
    return ys[row];
  }

  public int count() {
    return ys.length;
  }

  /** Upper edge of the board. */
  public double top() {
    return top;
  }

  /** Lower edge of the board. */
  public double bottom() {
    return bottom;
  }

  public double middle() {
    return (top + bottom) / 2;
  }

  /** Height of one row. */
  public double rowPx() {
    return rowPx;
  }

  /** The row that lies highest on the screen. */
  int uppermost() {
    return ys[0] <= ys[ys.length - 1] ? 0 : ys.length - 1;
  }

  int lowermost() {
    return ys.length - 1 - uppermost();
  }
}
