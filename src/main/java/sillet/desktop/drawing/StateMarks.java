package sillet.desktop.drawing;

import javafx.scene.paint.Color;

/** Draws the marks of checks, readings and saving around a middle. */
final class StateMarks {
  private static final double UPRIGHT_EM = 0.86;
  private static final double DOT_EM = 0.25;
  private static final double SQUARE_EM = 0.93;

  private StateMarks() {}

  private static void limit(Pen pen, double x, double y) {
    double half = pen.em(UPRIGHT_EM / 2);
    pen.upright(x, y - half, y + half, new Stroke(pen.inks().ink(), pen.atLeast(2, 0.14)));
  }

  static void inside(Pen pen, double x, double y) {
    limit(pen, x - pen.em(0.43), y);
    limit(pen, x + pen.em(0.43), y);
    pen.dot(pen.inks().ink(), x, y, pen.em(DOT_EM));
  }

  static void outside(Pen pen, double x, double y, int side) {
    limit(pen, x - side * pen.em(0.75), y);
    limit(pen, x, y);
    pen.dot(pen.inks().pencil(), x + side * pen.em(0.57), y, pen.em(DOT_EM));
  }

  static void noTarget(Pen pen, double x, double y) {
    pen.ring(new Stroke(pen.inks().ink(), pen.atLeast(1.5, 0.12)), x, y, pen.em(0.21));
  }

  /** An empty balloon on its leader. */
  static void finding(Pen pen, double x, double y) {
    Stroke stroke = new Stroke(pen.inks().pencil(), pen.atLeast(1.5, 0.12));
    double radius = pen.em(0.39);
    double ringX = x + pen.em(0.21);
    double ringY = y - pen.em(0.11);
    pen.ring(stroke, ringX, ringY, radius);
    double touch = radius * 0.78;
    pen.line(ringX - touch, ringY + touch * 0.7, x - pen.em(0.6), y + pen.em(0.5), stroke);
  }

  static void readAgain(Pen pen, double x, double y) {
    double radius = pen.em(0.52);
    double step = 2 * Math.PI * radius / 9;
    Stroke ring = new Stroke(pen.inks().pencil(), pen.atLeast(1.5, 0.125));
    pen.ring(ring.broken(step * 0.55, step * 0.45), x, y, radius);
    double reach = pen.em(0.64);
    pen.line(
        x - reach, y + reach, x + reach, y - reach, new Stroke(pen.inks().pencil(), ring.width()));
  }

  private static Box square(Pen pen, double x, double y, double em) {
    return Box.around(x, y, pen.em(em), pen.em(em));
  }

  static void saved(Pen pen, double x, double y) {
    pen.block(pen.inks().ink(), square(pen, x, y, SQUARE_EM));
  }

  static void draft(Pen pen, double x, double y) {
    Box box = square(pen, x, y, SQUARE_EM);
    openSquare(pen, box, pen.inks().ink());
    pen.block(pen.inks().ink(), new Box(box.x(), y, box.width(), box.height() / 2));
  }

  static void notSaved(Pen pen, double x, double y) {
    Color pencil = pen.inks().pencil();
    openSquare(pen, square(pen, x, y, SQUARE_EM), pencil);
    double reach = pen.em(0.21);
    Stroke cross = new Stroke(pencil, pen.atLeast(1.5, 0.12));
    pen.line(x - reach, y - reach, x + reach, y + reach, cross);
    pen.line(x - reach, y + reach, x + reach, y - reach, cross);
  }

  private static void openSquare(Pen pen, Box box, Color colour) {
    pen.openBlock(new Stroke(colour, pen.atLeast(2, 0.14)), Color.TRANSPARENT, box);
  }

  static void done(Pen pen, double x, double y) {
    pen.path(
        new Stroke(pen.inks().ink(), pen.atLeast(2, 0.16)),
        x - pen.em(0.43),
        y + pen.em(0.02),
        x - pen.em(0.13),
        y + pen.em(0.33),
        x + pen.em(0.43),
        y - pen.em(0.33));
  }

  static void notYet(Pen pen, double x, double y) {
    Stroke stroke = new Stroke(pen.inks().ink(), pen.atLeast(1.5, 0.11));
    pen.openBlock(stroke, Color.TRANSPARENT, square(pen, x, y, 0.68));
  }
}
