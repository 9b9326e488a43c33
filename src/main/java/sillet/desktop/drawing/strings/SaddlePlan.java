package sillet.desktop.drawing.strings;

import javafx.scene.paint.Color;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.Arrow;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Snap;
import sillet.desktop.drawing.Stroke;
import sillet.desktop.drawing.Whisker;

/** Draws one string's saddle on the plan: where it stands, where it should go, how sure that is. */
final class SaddlePlan {
  private static final double SHORTEST_ARROW_EM = 0.9;

  private final Pen pen;
  private final SheetGeometry sheet;
  private final BridgePlanGeometry plan;
  private final double blockHeight;
  private final double blockWidth;

  SaddlePlan(Pen pen, SheetGeometry sheet) {
    this.pen = pen;
    this.sheet = sheet;
    this.plan = sheet.plan();
    this.blockHeight = Snap.odd(pen.em(sheet.measures().block()));
    this.blockWidth = pen.em(sheet.picture().isOnePiece() ? 0.36 : 0.57);
  }

  /** Draws a saddle; the target stands where it is said to be now, which may still be gliding. */
  void paint(SaddleMark saddle, double y, @Nullable Double targetMm) {
    brackets(saddle, y);
    Double before = saddle.beforeMm();
    if (before != null) {
      Stroke thin = new Stroke(pen.inks().line(), 1);
      pen.openBlock(thin, pen.inks().sheet(), block(plan.x(before), y, pen.em(0.43)));
    }
    pen.block(pen.inks().ink(), block(plan.x(saddle.nowMm()), y, blockWidth));
    if (targetMm != null) {
      target(saddle, y, targetMm);
    }
    whisker(saddle, y);
  }

  private Box block(double x, double y, double width) {
    return Box.around(x, y, width, blockHeight);
  }

  private void brackets(SaddleMark saddle, double y) {
    if (saddle.travelNeckMm() != null) {
      bracket(plan.x(saddle.travelNeckMm()), y, sheet.away());
    }
    if (saddle.travelAwayMm() != null) {
      bracket(plan.x(saddle.travelAwayMm()), y, -sheet.away());
    }
  }

  private void bracket(double x, double y, int inward) {
    double half = Snap.px(blockHeight * 0.47);
    double arm = inward * pen.em(0.36);
    Stroke stroke = new Stroke(pen.inks().soft(), pen.atLeast(2, 0.13));
    double at = pen.edge(x);
    double middle = Math.floor(y);
    pen.path(
        stroke,
        at + arm,
        middle - half,
        at,
        middle - half,
        at,
        middle + half,
        at + arm,
        middle + half);
  }

  private void target(SaddleMark saddle, double y, double targetMm) {
    Stroke stroke = new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.14));
    double width = pen.em(sheet.picture().isOnePiece() ? 0.46 : 0.5);
    double x = plan.x(targetMm);
    pen.openBlock(stroke, pen.inks().sheet(), block(x, y, width));
    arrow(plan.x(saddle.nowMm()), x, arrowY(y));
    Double wanted = saddle.targetMm();
    if (wanted != null && !wanted.equals(saddle.reachableMm())) {
      beyond(x, plan.x(wanted), arrowY(y));
    }
  }

  private double arrowY(double y) {
    return sheet.measures().tight() ? y : y - blockHeight / 3;
  }

  private void arrow(double nowX, double targetX, double y) {
    double side = Math.signum(targetX - nowX);
    double from = nowX + side * (blockWidth / 2 + pen.em(0.21));
    double to = targetX - side * (pen.em(0.25) + pen.em(0.18));
    if (side * (to - from) >= pen.em(SHORTEST_ARROW_EM) - pen.em(0.39)) {
      Arrow.level(pen, new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.14)), from, to, y);
    }
  }

  /** The way that is not there: what the string wants beyond the travel. */
  private void beyond(double targetX, double wantedX, double y) {
    double side = Math.signum(wantedX - targetX);
    double from = targetX + side * pen.em(0.36);
    double end = sheet.stringEndX() - sheet.away() * pen.em(0.21);
    double to = side * (end - wantedX) < 0 && side == sheet.away() ? end : wantedX;
    Stroke broken = new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.14));
    Stroke dashes = broken.broken(pen.em(0.29), pen.em(0.21));
    if (side * (to - from) > pen.em(0.5)) {
      pen.level(from, to - side * pen.em(0.43), y, dashes);
      Arrow.level(pen, broken, to - side * pen.em(0.43), to, y);
    }
  }

  private void whisker(SaddleMark saddle, double y) {
    if (saddle.lowMm() == null || saddle.highMm() == null) {
      return;
    }
    Color colour = saddle.targetMm() == null ? pen.inks().soft() : pen.inks().pencil();
    double[] ends = {plan.x(plan.drawn(saddle.lowMm())), plan.x(plan.drawn(saddle.highMm()))};
    double below = blockHeight / 2 + pen.em(sheet.measures().tight() ? 0.32 : 0.4);
    Whisker.level(pen, colour, Math.min(ends[0], ends[1]), Math.max(ends[0], ends[1]), y + below);
  }
}
