package sillet.desktop.sets;

import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** The load of a whole set on the neck as a bar: full for the chosen set, open for the compared. */
final class LoadBar extends DrawnBand {
  private final double share;
  private final boolean full;

  /**
   * A bar.
   *
   * @param share of the larger of the two loads, 0 to 1
   * @param full whether it is the chosen set's
   */
  LoadBar(double share, boolean full) {
    super(20, 9, 2.14);
    this.share = share;
    this.full = full;
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double thick = pen.em(full ? 1.29 : 0.57);
    Box box = new Box(0, (height - thick) / 2, share * TensionBars.scaleWidth(pen, width), thick);
    if (full) {
      pen.block(pen.inks().ink(), box);
    } else {
      pen.openBlock(new Stroke(pen.inks().ink(), 1), pen.inks().sheet(), box);
    }
  }
}
