package sillet.desktop.drawing.strings;

import java.util.List;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** Draws the strings: a tenth of a px for each thousandth of an inch, times text size. */
final class StringLines {
  private static final double PX_PER_INCH = 100;
  private static final double USUAL_EM = 14;

  private StringLines() {}

  /** Width of each line in px. None is thinner than a pixel: then all grow in proportion. */
  static double[] widths(List<StringRow> rows, double em) {
    double[] widths =
        rows.stream().mapToDouble(r -> r.gaugeIn() * PX_PER_INCH * em / USUAL_EM).toArray();
    double thinnest = Double.POSITIVE_INFINITY;
    for (double width : widths) {
      thinnest = Math.min(thinnest, width);
    }
    for (int i = 0; i < widths.length && thinnest < 1; i++) {
      widths[i] /= thinnest;
    }
    return widths;
  }

  static void paint(Pen pen, SheetGeometry sheet, double[] widths) {
    for (int row = 0; row < widths.length; row++) {
      double y = sheet.rows().y(row);
      double nut = sheet.strip().fretX(row, 0);
      line(pen, nut, sheet.breakNearX(), y, widths[row]);
      paintAtBridge(pen, sheet, row, widths[row]);
    }
  }

  private static void paintAtBridge(Pen pen, SheetGeometry sheet, int row, double width) {
    double y = sheet.rows().y(row);
    SaddleMark saddle = sheet.picture().rows().get(row).saddle();
    if (!sheet.picture().isOnePiece() || saddle == null) {
      line(pen, sheet.breakFarX(), sheet.stringEndX(), y, width);
      return;
    }
    double breakPoint = sheet.plan().x(saddle.nowMm());
    line(pen, sheet.breakFarX(), breakPoint, y, width);
    double dot = Math.min(2, Math.max(1.3, width));
    Stroke dotted = new Stroke(pen.inks().line(), dot).broken(dot, pen.em(0.21));
    pen.level(breakPoint + sheet.away() * pen.em(0.5), sheet.stringEndX(), y, dotted);
  }

  /** Rows stand on the middle of a pixel, so that the thinnest lines stay black. */
  private static void line(Pen pen, double fromX, double toX, double y, double width) {
    pen.line(fromX, y, toX, y, new Stroke(pen.inks().ink(), width));
  }
}
