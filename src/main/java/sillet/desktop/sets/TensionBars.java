package sillet.desktop.sets;

import java.util.OptionalDouble;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/**
 * One string's tension as a full bar, the compared set's as an open bar under it, and the upright
 * of equal tension through both. Rows stand on each other without a gap, so that the lines of the
 * scale and the upright go through.
 */
final class TensionBars extends DrawnBand {
  private static final double END_EM = 2.9;
  private static final double LEAST_EM = 2.6;

  private final TensionScale scale;
  private final Values values;

  /**
   * What a row shows.
   *
   * @param nowN tension of the chosen set; empty where there is none
   * @param comparedN of the compared set
   * @param comparedGauge printed at the end of its bar
   * @param equalN equal tension of the chosen set
   */
  record Values(
      OptionalDouble nowN, OptionalDouble comparedN, String comparedGauge, OptionalDouble equalN) {}

  TensionBars(TensionScale scale, Values values) {
    super(20, 9, LEAST_EM);
    this.scale = scale;
    this.values = values;
  }

  /** How much of the width the scale takes; behind it stands the gauge of the longest open bar. */
  static double scaleWidth(Pen pen, double width) {
    return Math.max(1, width - pen.em(END_EM));
  }

  /** The upright lines of the scale. */
  static void grid(Pen pen, TensionScale scale, double width, double height) {
    double wide = scaleWidth(pen, width);
    for (double at = 0; at <= scale.mostN() + 1e-9; at += scale.stepN()) {
      pen.upright(scale.x(at, wide), 0, height, new Stroke(pen.inks().hair(), 1));
    }
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    grid(pen, scale, width, height);
    double wide = scaleWidth(pen, width);
    double thick = Math.min(pen.em(1.29), height * 0.3);
    double thin = Math.min(pen.em(0.57), height * 0.17);
    double top = (height - thick - thin - pen.em(0.43)) / 2;
    if (values.nowN().isPresent()) {
      double end = scale.x(values.nowN().getAsDouble(), wide);
      pen.block(pen.inks().ink(), new Box(0, top, end, thick));
    }
    if (values.comparedN().isPresent()) {
      double end = scale.x(values.comparedN().getAsDouble(), wide);
      double y = top + thick + pen.em(0.43);
      Stroke edge = new Stroke(pen.inks().ink(), 1);
      pen.openBlock(edge, pen.inks().sheet(), new Box(0, y, end, thin));
      upright(pen, wide, height);
      Lettering note = Lettering.plain(0.86, pen.inks().soft());
      pen.textAround(values.comparedGauge(), note, end + pen.em(0.43), y + thin / 2);
    } else {
      upright(pen, wide, height);
    }
  }

  private void upright(Pen pen, double wide, double height) {
    if (values.equalN().isPresent()) {
      equal(pen, scale.x(values.equalN().getAsDouble(), wide), height);
    }
  }

  /** Stands free of the bars, on a strip of the sheet's own ground. */
  static void equal(Pen pen, double x, double height) {
    pen.block(pen.inks().sheet(), Box.around(x, height / 2, pen.em(0.29), height));
    Stroke dashDot =
        new Stroke(pen.inks().ink(), pen.atLeast(1, 0.1))
            .broken(pen.em(0.57), pen.em(0.22), pen.em(0.14), pen.em(0.22));
    pen.upright(x, 0, height, dashDot);
  }
}
