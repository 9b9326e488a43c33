package sillet.desktop.drawing;

/** A level arrow with a full head. */
public final class Arrow {
  /**
   * Length and half height of the head, in widths of the shaft: a thin shaft keeps a clear head.
   */
  private static final double HEAD_LENGTH = 3.3;

  private static final double HEAD_HALF = 2.0;

  private Arrow() {}

  /**
   * Draws from one place to another; the head ends at the second. Too short a way leaves only a
   * head.
   */
  public static void level(Pen pen, Stroke stroke, double fromX, double toX, double y) {
    double side = Math.signum(toX - fromX);
    double headLength = Math.min(Math.max(5, HEAD_LENGTH * stroke.width()), Math.abs(toX - fromX));
    double headHalf = Math.max(4, HEAD_HALF * stroke.width());
    double at = Snap.px(stroke.width()) % 2 == 1 ? pen.middle(y) : pen.edge(y);
    double neck = toX - side * headLength;
    pen.level(fromX, neck, at, stroke);
    pen.area(stroke.colour(), neck, at - headHalf, toX, at, neck, at + headHalf);
  }
}
