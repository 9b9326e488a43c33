package sillet.desktop.drawing;

/**
 * The line that joins a field to what is wrong with it: a dot on the field's border, then a line.
 */
public final class Leader extends Glyph {
  private static final double LENGTH_EM = 1.71;
  private static final double DOT_EM = 0.25;

  /** A leader; the message beside it carries the words. */
  public Leader() {
    super("");
  }

  /** Keeps the dot on the border of the field to the left. */
  @Override
  protected void restyled() {
    super.restyled();
    setTranslateX(-DOT_EM * em());
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double radius = pen.em(DOT_EM);
    double at = pen.edge(height / 2);
    pen.level(radius, width, at, new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.14)));
    pen.dot(pen.inks().pencil(), radius, at, radius);
  }

  @Override
  protected double widthPx() {
    return em() * LENGTH_EM;
  }

  @Override
  protected double heightPx() {
    return em();
  }
}
