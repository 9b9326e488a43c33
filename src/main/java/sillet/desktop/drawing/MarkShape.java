package sillet.desktop.drawing;

/** The marks. Each says its state by shape; a word always stands beside it. */
public enum MarkShape {
  /** Between its limits. */
  INSIDE(1.0),
  /** Above the upper limit. */
  OUTSIDE_ABOVE(1.64),
  /** Below the lower limit. */
  OUTSIDE_BELOW(1.64),
  /** The shop has set no limits. */
  NO_TARGET(0.57),
  /** Stale. */
  READ_AGAIN(1.43),
  /** What a saddle does not cure. */
  FINDING(1.29),
  /** The interval covers the saddle. */
  LEAVE(1.64),
  /** A saddle now, a saddle target to the right of it. */
  MOVE(1.64),
  /** The same where the neck lies to the right. */
  MOVE_LEFT(1.64),
  /** The way to move a saddle, beside its words. */
  ARROW_RIGHT(1.71),
  ARROW_LEFT(1.71),
  /** On the disk. */
  SAVED(0.93),
  /** Kept, not yet part of the record. */
  DRAFT(0.93),
  NOT_SAVED(0.93),
  DONE(0.93),
  /** Open: what is next. */
  NOT_YET(0.71);

  private final double widthEm;

  MarkShape(double widthEm) {
    this.widthEm = widthEm;
  }

  /** Width of the shape itself. */
  public double widthEm() {
    return widthEm;
  }

  /** Draws the mark around a middle. */
  public void paint(Pen pen, double x, double y) {
    switch (this) {
      case INSIDE -> StateMarks.inside(pen, x, y);
      case OUTSIDE_ABOVE -> StateMarks.outside(pen, x, y, 1);
      case OUTSIDE_BELOW -> StateMarks.outside(pen, x, y, -1);
      case NO_TARGET -> StateMarks.noTarget(pen, x, y);
      case READ_AGAIN -> StateMarks.readAgain(pen, x, y);
      case FINDING -> StateMarks.finding(pen, x, y);
      case LEAVE -> MoveMarks.leave(pen, x, y);
      case MOVE -> MoveMarks.move(pen, x, y, 1);
      case MOVE_LEFT -> MoveMarks.move(pen, x, y, -1);
      case ARROW_RIGHT -> MoveMarks.arrow(pen, x, y, 1);
      case ARROW_LEFT -> MoveMarks.arrow(pen, x, y, -1);
      case SAVED -> StateMarks.saved(pen, x, y);
      case DRAFT -> StateMarks.draft(pen, x, y);
      case NOT_SAVED -> StateMarks.notSaved(pen, x, y);
      case DONE -> StateMarks.done(pen, x, y);
      case NOT_YET -> StateMarks.notYet(pen, x, y);
    }
  }
}
