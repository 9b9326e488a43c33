package sillet.desktop.frets;

import java.util.OptionalDouble;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** What a fret's place costs, as a bar from the middle: right is sharp, left is flat. */
final class CostBar extends DrawnBand {
  /** Cents at the ends. */
  static final double MOST_CENTS = 3;

  private OptionalDouble cents = OptionalDouble.empty();

  CostBar() {
    super(9, 4, 1.6);
  }

  void show(OptionalDouble newCents) {
    cents = newCents;
    requestLayout();
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double middle = width / 2;
    for (int cent = -2; cent <= 2; cent++) {
      double x = middle + cent / MOST_CENTS * middle;
      Stroke line = new Stroke(cent == 0 ? pen.inks().line() : pen.inks().hair(), 1);
      pen.upright(x, 0, height, line);
    }
    if (cents.isEmpty()) {
      return;
    }
    double value = cents.getAsDouble();
    double clamped = Math.max(-MOST_CENTS, Math.min(MOST_CENTS, value));
    double end = middle + clamped / MOST_CENTS * middle;
    double thick = pen.em(0.64);
    double from = Math.min(middle, end);
    double wide = Math.max(pen.em(0.14), Math.abs(end - middle));
    pen.block(pen.inks().ink(), new Box(from, (height - thick) / 2, wide, thick));
    if (clamped != value) {
      double way = Math.signum(value);
      double tip = pen.em(0.5);
      pen.area(
          pen.inks().ink(),
          end - way * tip,
          height / 2 - tip,
          end,
          height / 2,
          end - way * tip,
          height / 2 + tip);
    }
  }
}
