package sillet.desktop.drawing.strings;

import javafx.scene.paint.Color;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Glyph;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Snap;
import sillet.desktop.drawing.Stroke;

/** What the signs on the neck strip mean, for the head of the sheet; a word stands beside each. */
public final class LegendGlyph extends Glyph {
  /** The signs. */
  public enum Sign {
    TEN_CENTS,
    READ,
    ESTIMATED,
    PREDICTED,
    PASS_BEFORE
  }

  private final Sign sign;
  private final double centEm;

  /** A sign at the size it has on a sheet with the given measures. */
  public LegendGlyph(Sign sign, SheetMeasures measures, String says) {
    super(says);
    this.sign = sign;
    this.centEm = measures.cent();
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double y = height / 2;
    Box block = Box.around(width / 2, y, pen.em(0.64), pen.em(1.29));
    switch (sign) {
      case TEN_CENTS -> tenCents(pen, width / 2, y);
      case READ -> pen.block(pen.inks().ink(), block);
      case ESTIMATED ->
          pen.block(pen.inks().ink(), Box.around(width / 2, y, pen.atLeast(2, 0.18), pen.em(1.29)));
      case PREDICTED ->
          pen.level(0, width, y, new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.13)));
      case PASS_BEFORE -> pen.openBlock(new Stroke(pen.inks().line(), 1), Color.TRANSPARENT, block);
    }
  }

  private void tenCents(Pen pen, double x, double y) {
    double half = Snap.px(pen.em(CentsBars.MOST_CENTS * centEm) / 2);
    double at = Snap.px(y);
    double arm = pen.em(0.29);
    Stroke stroke = new Stroke(pen.inks().ink(), pen.atLeast(2, 0.13));
    pen.upright(x, at - half, at + half, stroke);
    pen.level(x - arm, x + arm, at - half, stroke);
    pen.level(x - arm, x + arm, at + half, stroke);
  }

  @Override
  protected double widthPx() {
    return em() * (sign == Sign.PREDICTED ? 1.29 : 0.71);
  }

  @Override
  protected double heightPx() {
    return em() * 1.86;
  }
}
