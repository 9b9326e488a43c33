package sillet.desktop.history;

import sillet.desktop.drawing.Glyph;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** The open or the full dot of the plots, beside its word. */
final class DotKey extends Glyph {
  private static final double RADIUS_EM = 0.32;

  private final boolean full;

  DotKey(boolean full) {
    super("");
    this.full = full;
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    if (full) {
      pen.dot(pen.inks().ink(), width / 2, height / 2, pen.em(RADIUS_EM));
    } else {
      double stroke = pen.atLeast(1.5, 0.11);
      Stroke ring = new Stroke(pen.inks().ink(), stroke);
      pen.ring(ring, width / 2, height / 2, pen.em(RADIUS_EM) - stroke / 2);
    }
  }

  @Override
  protected double widthPx() {
    return em() * (2 * RADIUS_EM + 0.14);
  }

  @Override
  protected double heightPx() {
    return em() * 1.2;
  }
}
