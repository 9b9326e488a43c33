package sillet.desktop.drawing.strings;

import sillet.desktop.drawing.Arrow;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** Draws where nut edges shall go: an arrow of one length at the nut, the way in figures above. */
final class NutArrows {
  private static final double LENGTH_EM = 1.29;
  private static final double FIGURE_UP_EM = 0.93;

  private NutArrows() {}

  static void paint(Pen pen, SheetGeometry sheet) {
    Stroke stroke = new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.16));
    for (NutMark nut : sheet.picture().nuts()) {
      double y = sheet.rows().y(nut.row());
      double near = sheet.strip().fretX(nut.row(), 0) + sheet.away() * pen.em(0.14);
      double far = near + sheet.away() * pen.em(LENGTH_EM);
      Arrow.level(pen, stroke, nut.towardBridge() ? near : far, nut.towardBridge() ? far : near, y);
      Lettering figure = Lettering.bold(0.86, pen.inks().pencil());
      pen.textAround(
          nut.figure(),
          sheet.away() > 0 ? figure : figure.endingThere(),
          near,
          y - pen.em(FIGURE_UP_EM));
    }
  }
}
