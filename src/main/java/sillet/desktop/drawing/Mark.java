package sillet.desktop.drawing;

import sillet.desktop.theme.Looks;

/** One mark as a node. It restyles itself with theme and text size. */
public final class Mark extends Glyph {
  private static final double COLUMN_EM = 1.71;
  private static final double HEIGHT_EM = 1.43;
  private static final double MARGIN_EM = 0.14;

  private MarkShape shape;

  /**
   * A mark as wide as a column of marks.
   *
   * @param shape what it shows
   * @param says the state in words, for screen readers
   */
  public Mark(MarkShape shape, String says) {
    super(says);
    this.shape = shape;
  }

  /** A mark for a line of words: small, and no wider than its shape. */
  public static Mark small(MarkShape shape, String says) {
    Mark mark = new Mark(shape, says);
    mark.getStyleClass().add(Looks.SMALL_MARK);
    return mark;
  }

  public MarkShape shape() {
    return shape;
  }

  /** Changes the state shown. */
  public void show(MarkShape newShape, String says) {
    shape = newShape;
    changed(says);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    shape.paint(pen, width / 2, height / 2);
  }

  @Override
  protected double widthPx() {
    boolean small = getStyleClass().contains(Looks.SMALL_MARK);
    return em() * (small ? shape.widthEm() + MARGIN_EM : COLUMN_EM);
  }

  @Override
  protected double heightPx() {
    return em() * HEIGHT_EM;
  }
}
