package sillet.desktop.sets;

import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.logbook.units.Figures;

/** The figures of the scale under the bars. */
final class TensionAxis extends DrawnBand {
  private final TensionScale scale;

  TensionAxis(TensionScale scale) {
    super(20, 9, 2);
    this.scale = scale;
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double wide = TensionBars.scaleWidth(pen, width);
    Lettering note = Lettering.plain(0.86, pen.inks().soft());
    double free = 0;
    for (double at = 0; at <= scale.mostN() + 1e-9; at += scale.stepN()) {
      String figure = at == 0 ? "0\u00a0N" : Figures.fixed(at, 0);
      double half = note.width(figure, pen.em(1)) / 2;
      double x = Math.max(half, scale.x(at, wide));
      if (at == 0 || x - half > free) {
        pen.textAround(figure, note.centred(), x, height / 2);
        free = x + half + pen.em(0.57);
      }
    }
  }
}
