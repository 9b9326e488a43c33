package sillet.desktop.sets;

import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;

/**
 * What stands over the bars: the name of the scale, and the figure of equal tension on its line.
 */
final class TensionHead extends DrawnBand {
  private final TensionScale scale;
  private final String name;
  private final String equal;
  private final double equalN;

  /**
   * A head.
   *
   * @param scale of the bars
   * @param name what they show
   * @param equal words and figure of equal tension; empty where there is none
   * @param equalN where it stands
   */
  TensionHead(TensionScale scale, String name, String equal, double equalN) {
    super(20, 9, 2);
    this.scale = scale;
    this.name = name;
    this.equal = equal;
    this.equalN = equalN;
    setAccessibleText(name + ", " + equal);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double middle = height / 2;
    Lettering soft = Lettering.plain(0.86, pen.inks().soft());
    Lettering ink = Lettering.plain(0.86, pen.inks().ink());
    double nameEnd = soft.width(name, pen.em(1));
    double words = ink.width(equal, pen.em(1));
    double at = scale.x(equalN, TensionBars.scaleWidth(pen, width)) - words / 2;
    double from = Math.max(0, Math.min(width - words, at));
    if (equal.isEmpty() || from > nameEnd + pen.em(0.57)) {
      pen.textAround(name, soft, 0, middle);
    }
    if (!equal.isEmpty()) {
      pen.textAround(equal, ink, from, middle);
    }
  }
}
