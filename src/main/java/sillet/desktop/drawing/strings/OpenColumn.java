package sillet.desktop.drawing.strings;

import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** Draws which fret the cells behind the board belong to: its line is lit, its number ringed. */
final class OpenColumn {
  private static final double LIT_EM = 1.57;
  private static final double RING_HEIGHT_EM = 1.57;
  private static final double RING_ROOM_EM = 0.57;

  private final Pen pen;
  private final SheetGeometry sheet;

  OpenColumn(Pen pen, SheetGeometry sheet) {
    this.pen = pen;
    this.sheet = sheet;
  }

  /** The light under the strings. */
  void paintGround() {
    StringsPicture.Column column = sheet.picture().board().column();
    if (column == null) {
      return;
    }
    double half = pen.em(LIT_EM / 2);
    double top = sheet.rows().top();
    double bottom = sheet.rows().bottom();
    double upper = sheet.strip().neckFretXAt(column.fret(), top);
    double lower = sheet.strip().neckFretXAt(column.fret(), bottom);
    pen.area(
        pen.inks().lamp(),
        pen.edge(upper - half),
        top,
        pen.edge(upper + half),
        top,
        pen.edge(lower + half),
        bottom,
        pen.edge(lower - half),
        bottom);
    Lettering number = Lettering.bold(1.14, pen.inks().ink());
    double around = number.width(Integer.toString(column.fret()), pen.em(1)) + pen.em(RING_ROOM_EM);
    ring(Box.around(upper, sheet.headLineY(), around, pen.em(RING_HEIGHT_EM)));
  }

  private void ring(Box around) {
    pen.openBlock(new Stroke(pen.inks().ink(), pen.atLeast(2, 0.14)), pen.inks().lamp(), around);
  }

  /** The head above the cells. */
  void paintHead(TakenRoom taken) {
    StringsPicture.Column column = sheet.picture().board().column();
    if (column == null) {
      return;
    }
    Lettering bold = Lettering.bold(1, pen.inks().ink()).centred();
    Box cell = sheet.cells().cell(0, column.fret());
    double middle = (cell.x() + cell.right()) / 2;
    taken.take(middle, bold.width(column.head(), pen.em(1)));
    pen.textAround(column.head(), bold, middle, sheet.headLineY());
  }
}
