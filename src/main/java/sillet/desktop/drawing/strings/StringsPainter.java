package sillet.desktop.drawing.strings;

import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** Draws the whole sheet, from the ground up. */
final class StringsPainter {
  private final Pen pen;
  private final SheetGeometry sheet;
  private final SheetWords words;

  StringsPainter(Pen pen, SheetGeometry sheet, SheetWords words) {
    this.pen = pen;
    this.sheet = sheet;
    this.words = words;
  }

  void paint(TargetGlide targets) {
    double[] widths = StringLines.widths(sheet.picture().rows(), sheet.em());
    BridgeLines bridge = new BridgeLines(pen, sheet);
    BoardLines board = new BoardLines(pen, sheet);
    bridge.paintGround();
    OpenColumn column = new OpenColumn(pen, sheet);
    column.paintGround();
    board.paint();
    StringLines.paint(pen, sheet, widths);
    bridge.paintOver();
    CentsBars.paint(pen, sheet, widths);
    NutArrows.paint(pen, sheet);
    SaddlePlan plan = new SaddlePlan(pen, sheet);
    for (int row = 0; row < widths.length; row++) {
      saddle(plan, row, targets.shownMm(row));
    }
    TakenRoom headLine = new TakenRoom();
    new StringNames(pen, sheet).paint(words, headLine);
    column.paintHead(headLine);
    board.paintNumbers(words, headLine);
    Rules rules = new Rules(pen, sheet);
    rules.paintNeckRule();
    rules.paintBridgeRule();
    scale();
    leaders();
  }

  private void saddle(SaddlePlan plan, int row, @Nullable Double targetMm) {
    SaddleMark saddle = sheet.picture().rows().get(row).saddle();
    if (saddle != null) {
      plan.paint(saddle, sheet.rows().y(row), targetMm);
    }
  }

  private void scale() {
    Lettering lettering = Lettering.plain(0.86, pen.inks().soft());
    String says = words.scale().say(sheet.plan().factor(), sheet.across());
    double left = Math.min(sheet.bridgeOutline().x(), sheet.bridgeOutline().right());
    pen.textAround(says, lettering, left, sheet.headLineY());
  }

  private void leaders() {
    Stroke stroke = new Stroke(pen.inks().pencil(), pen.atLeast(1.2, 0.09));
    for (FindingMark finding : sheet.picture().findings()) {
      FindingLeader leader = FindingLeader.of(sheet, finding);
      pen.line(
          leader.fromX(), leader.fromY(), leader.toX(pen.em(1)), leader.toY(pen.em(1)), stroke);
    }
  }
}
