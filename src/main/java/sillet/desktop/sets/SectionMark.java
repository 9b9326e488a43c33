package sillet.desktop.sets;

import java.util.OptionalDouble;
import sillet.desktop.drawing.Glyph;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.ScreenDots;
import sillet.desktop.drawing.Stroke;

/** A string cut across, many times life size: the core in ink, the wrap around it. */
final class SectionMark extends Glyph {
  private static final int[] FACTORS = {12, 10, 8, 6, 5, 4, 3, 2};
  private static final double WIDTH_EM = 4.3;

  private final double gaugeIn;
  private final OptionalDouble coreIn;
  private final int factor;

  /**
   * A section.
   *
   * @param gaugeIn outer diameter, inches
   * @param coreIn core of a wound string; empty for a plain one
   * @param factor times life size
   */
  SectionMark(double gaugeIn, OptionalDouble coreIn, int factor) {
    super("");
    this.gaugeIn = gaugeIn;
    this.coreIn = coreIn;
    this.factor = factor;
  }

  /**
   * How many times life size the thickest string of a set still fits.
   *
   * @param gaugeIn the thickest, inches
   * @param roomPx height there is
   */
  static int factor(double gaugeIn, double roomPx) {
    for (int factor : FACTORS) {
      if (gaugeIn * ScreenDots.perInch() * factor <= roomPx) {
        return factor;
      }
    }
    return 1;
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double perInch = ScreenDots.perInch() * factor;
    double radius = gaugeIn * perInch / 2;
    double x = width / 2;
    double y = height / 2;
    if (coreIn.isEmpty()) {
      pen.dot(pen.inks().ink(), x, y, radius);
      return;
    }
    double core = coreIn.getAsDouble() * perInch / 2;
    double edge = pen.atLeast(1, 0.1);
    pen.dot(pen.inks().line(), x, y, radius);
    pen.ring(new Stroke(pen.inks().ink(), edge), x, y, radius - edge / 2);
    pen.dot(pen.inks().sheet(), x, y, core + edge);
    pen.dot(pen.inks().ink(), x, y, core);
  }

  @Override
  protected double widthPx() {
    return em() * WIDTH_EM;
  }

  @Override
  protected double heightPx() {
    return 0;
  }
}
