package sillet.desktop.drawing.strings;

/**
 * The sizes that follow from the shape of the window and the strings, in em.
 *
 * @param names column of string names, up to the nut
 * @param bridge from the break line to the words
 * @param words column of words
 * @param row height of a string's row
 * @param courseGap more room between two courses
 * @param cellHeight of a reading cell
 * @param widestCell widest a cell may grow
 * @param figure largest type of a cell's figure
 * @param turns type of the turns
 * @param direction type of the direction words
 * @param along wanted scale of the bridge plan, times life size
 * @param gaps the gaps between the parts of the sheet
 */
public record SheetMeasures(
    double names,
    double bridge,
    double words,
    double row,
    double courseGap,
    double cellHeight,
    double widestCell,
    double figure,
    double turns,
    double direction,
    double along,
    Gaps gaps) {
  /**
   * Gaps between the parts of a sheet, in em.
   *
   * @param boardToBreak end of the board to the first break line
   * @param breakLines between the two break lines
   * @param breakToPlan second break line to the outline of the bridge
   * @param planToEnd outline to the end of the strings
   * @param inPlan outline to what is drawn in it
   */
  record Gaps(
      double boardToBreak, double breakLines, double breakToPlan, double planToEnd, double inPlan) {
    static final Gaps USUAL = new Gaps(0.71, 1.14, 1.36, 0.79, 0.64);
    static final Gaps NARROW = new Gaps(0.43, 0.81, 0.38, 0.24, 0.3);
  }

  /** A cell of 2 em and its ring. */
  static final double LEAST_ROW = 2.43;

  /** Under this, words stand on one line and marks keep within the row. */
  static final double TIGHT_ROW = 3;

  private static final double MOST_ROW = 5.7;
  private static final double COURSE_GAP = 0.57;

  /** The measures for a window's shape and what is drawn. */
  public static SheetMeasures of(SheetShape shape, StringsPicture picture) {
    SheetMeasures base =
        switch (shape) {
          case NARROW ->
              new SheetMeasures(
                  4.14, 8.1, 15.5, 20.6, COURSE_GAP, 1.8, 3.8, 1.1, 1.71, 1.24, 4.5, Gaps.NARROW);
          case USUAL ->
              new SheetMeasures(
                  7.64, 17, 20.57, 21.4, COURSE_GAP, 2, 4.3, 1.21, 1.71, 1.24, 6, Gaps.USUAL);
          case WIDE ->
              new SheetMeasures(
                  9.71, 18.8, 24.3, 34.2, COURSE_GAP, 2.6, 5.4, 1.43, 2.29, 1.57, 7, Gaps.USUAL);
        };
    if (picture.isOnePiece() && shape != SheetShape.NARROW) {
      base = base.forOnePiece(shape == SheetShape.USUAL ? 23.16 : base.row);
    }
    return base.forStrings(picture, shape);
  }

  private SheetMeasures forOnePiece(double allRows) {
    return new SheetMeasures(
        names,
        13.6,
        21.1,
        allRows,
        courseGap,
        cellHeight,
        widestCell,
        figure,
        turns,
        Math.max(1.43, direction),
        11,
        gaps);
  }

  private SheetMeasures forStrings(StringsPicture picture, SheetShape shape) {
    double each = Math.max(LEAST_ROW, Math.min(MOST_ROW, row / picture.rows().size()));
    boolean tight = each < TIGHT_ROW;
    boolean roomy = each >= 5;
    boolean courses = picture.hasCourses();
    boolean narrow = shape == SheetShape.NARROW;
    return new SheetMeasures(
        !courses ? names : narrow ? 4.86 : Math.max(8, names),
        bridge,
        tight && shape == SheetShape.USUAL ? 21.9 : words,
        each,
        courseGap,
        narrow ? cellHeight : roomy ? 2.6 : 2,
        roomy ? 5.4 : widestCell,
        roomy ? 1.43 : figure,
        tight ? (narrow ? 1.21 : 1.71) : turns,
        tight ? (narrow ? 1.07 : 1.21) : direction,
        tight && shape == SheetShape.USUAL ? 5.5 : along,
        gaps);
  }

  /** Words stand on one line. */
  public boolean tight() {
    return row < TIGHT_ROW;
  }

  /** Length of one cent. */
  double cent() {
    return tight() ? 0.114 : 0.157;
  }

  /** Height of a saddle block. */
  double block() {
    return Math.max(1.43, Math.min(3, row * 0.5));
  }
}
