package sillet.desktop.forecast;

import javafx.scene.paint.Color;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/**
 * The tension of one string: a full bar as it is, an open bar as it will be; an upright, dash and
 * dot, where every string would pull alike.
 */
final class TensionBars extends DrawnBand {
  private static final double BAR_EM = 0.5;

  private double now;
  private double then;
  private double alike;
  private double most = 1;

  TensionBars() {
    super(15, 6, 2);
  }

  /**
   * Shows tensions in newtons.
   *
   * @param nowN as it is, 0 where not known
   * @param thenN as it will be, 0 where not known
   * @param alikeN mean of all strings then
   * @param mostN end of the scale, for all strings the same
   */
  void show(double nowN, double thenN, double alikeN, double mostN) {
    now = nowN;
    then = thenN;
    alike = alikeN;
    most = Math.max(1, mostN);
    requestLayout();
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double half = pen.em(BAR_EM);
    double middle = Math.floor(height / 2);
    pen.upright(0.5, middle - 2 * half, middle + 2 * half, new Stroke(pen.inks().line(), 1));
    pen.block(pen.inks().ink(), new Box(0, middle - half - 1, now / most * width, half));
    if (then > 0) {
      Stroke open = new Stroke(pen.inks().ink(), pen.atLeast(1.5, 0.11));
      pen.openBlock(
          open, Color.TRANSPARENT, new Box(0, middle + 1, Math.max(4, then / most * width), half));
    }
    double at = alike / most * width;
    pen.upright(
        at,
        middle - 2 * half,
        middle + 2 * half,
        new Stroke(pen.inks().soft(), 1).broken(6, 3, 1, 3));
  }
}
