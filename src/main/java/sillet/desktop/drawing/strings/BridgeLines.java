package sillet.desktop.drawing.strings;

import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** Draws what stands still at the bridge: its outline, the nominal scale line, the break line. */
final class BridgeLines {
  private static final double OVER_EM = 0.29;
  private static final double CORNER_EM = 0.2;

  private final Pen pen;
  private final SheetGeometry sheet;

  BridgeLines(Pen pen, SheetGeometry sheet) {
    this.pen = pen;
    this.sheet = sheet;
  }

  /** The ground of a one-piece saddle lies under the strings; an outline does no harm there. */
  void paintGround() {
    if (sheet.picture().isOnePiece()) {
      Stroke edge = new Stroke(pen.inks().ink(), pen.atLeast(2, 0.14));
      pen.openBlock(edge, pen.inks().field(), sheet.bridgeOutline());
    } else {
      pen.outline(pen.inks().line(), sheet.bridgeOutline(), pen.em(CORNER_EM));
    }
  }

  void paintOver() {
    if (!sheet.picture().isOnePiece()) {
      Stroke dashDot =
          new Stroke(pen.inks().soft(), 1).broken(pen.em(0.57), pen.em(0.25), 1.5, pen.em(0.25));
      pen.upright(sheet.plan().x(0), sheet.rows().top(), sheet.ruleY(), dashDot);
    }
    breakLine(sheet.breakNearX());
    breakLine(sheet.breakFarX());
  }

  private void breakLine(double lineX) {
    double x = pen.middle(lineX);
    double middle = sheet.rows().middle();
    double aside = pen.em(0.36);
    double tall = pen.em(0.64);
    double steep = pen.em(0.21);
    pen.path(
        new Stroke(pen.inks().soft(), 1),
        x,
        sheet.rows().top() - pen.em(OVER_EM),
        x,
        middle - tall,
        x - aside,
        middle - steep,
        x + aside,
        middle + steep,
        x,
        middle + tall,
        x,
        sheet.rows().bottom() + pen.em(OVER_EM));
  }
}
