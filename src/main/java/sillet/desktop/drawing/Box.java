package sillet.desktop.drawing;

/**
 * A box in px.
 *
 * @param x left edge
 * @param y top edge
 * @param width px
 * @param height px
 */
public record Box(double x, double y, double width, double height) {
  public double right() {
    return x + width;
  }

  public double bottom() {
    return y + height;
  }

  public double middleX() {
    return x + width / 2;
  }

  public double middleY() {
    return y + height / 2;
  }

  /** A box around a middle. */
  public static Box around(double middleX, double middleY, double width, double height) {
    return new Box(middleX - width / 2, middleY - height / 2, width, height);
  }

  /** A box between two heights or sides given in any order. */
  public static Box between(double x, double fromY, double width, double toY) {
    return new Box(x, Math.min(fromY, toY), width, Math.abs(toY - fromY));
  }
}
