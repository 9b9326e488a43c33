package sillet.desktop.drawing;

import javafx.scene.paint.Color;

/** Draws the marks of saddles: leave it, move, and the arrows, around a middle. */
final class MoveMarks {
  private static final double BLOCK_WIDTH_EM = 0.36;
  private static final double BLOCK_HEIGHT_EM = 0.86;

  private MoveMarks() {}

  static void leave(Pen pen, double x, double y) {
    double reach = pen.em(0.79);
    Whisker.level(pen, pen.inks().ink(), x - reach, x + reach, y);
    pen.block(pen.inks().ink(), block(pen, x, y));
  }

  static void move(Pen pen, double x, double y, int side) {
    double out = pen.em(0.64);
    pen.block(pen.inks().ink(), block(pen, x - side * out, y));
    Arrow.level(
        pen,
        new Stroke(pen.inks().pencil(), pen.atLeast(1.5, 0.12)),
        x - side * pen.em(0.39),
        x + side * pen.em(0.39),
        y);
    Stroke open = new Stroke(pen.inks().pencil(), pen.atLeast(1, 0.1));
    pen.openBlock(open, Color.TRANSPARENT, block(pen, x + side * out, y));
  }

  static void arrow(Pen pen, double x, double y, int side) {
    double reach = side * pen.em(0.86);
    Stroke stroke = new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.21));
    Arrow.level(pen, stroke, x - reach, x + reach, y);
  }

  private static Box block(Pen pen, double x, double y) {
    return Box.around(x, y, pen.atLeast(4, BLOCK_WIDTH_EM), pen.em(BLOCK_HEIGHT_EM));
  }
}
