package sillet.desktop.start;

import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/** Strings nobody has read yet, from nut to bridge: what a visit begins with. An ornament. */
final class EmptyBoard extends DrawnBand {
  private static final double[] GAUGES = {.010, .013, .017, .026, .036, .046};
  private static final double[] SADDLES = {0.15, 0.25, 0.4, 0.2, 0.32, 0.48};
  private static final int FRETS = 22;
  private static final int READ_FRET = 12;
  private static final double BOARD_END = 0.7;
  private static final double PX_PER_INCH_OF_GAUGE = 100;

  private final String nut;
  private final String bridge;

  EmptyBoard(String nut, String bridge) {
    super(24, 16, 13.14);
    this.nut = nut;
    this.bridge = bridge;
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double top = pen.em(1.57);
    double boardEnd = width * BOARD_END;
    Stroke line = new Stroke(pen.inks().line(), 1);
    for (int fret = 1; fret <= FRETS; fret++) {
      pen.upright(fretX(fret, boardEnd), top, height, line);
    }
    pen.level(0, boardEnd, top, line);
    pen.level(0, boardEnd, height - 1, line);
    double step = (height - top) / GAUGES.length;
    for (int i = 0; i < GAUGES.length; i++) {
      string(pen, i, top + (i + 0.5) * step, width);
    }
    pen.block(pen.inks().ink(), new Box(0, top, pen.atLeast(4, 0.29), height - top));
    breakLine(pen, boardEnd, top, height);
    words(pen, width, boardEnd);
  }

  /** Fret n of equal temperament; the last fret stands just before the end of what is drawn. */
  private static double fretX(int fret, double boardEnd) {
    return share(fret) / share(FRETS) * boardEnd * 0.98;
  }

  private static double share(int fret) {
    return 1 - Math.pow(2, -fret / 12.0);
  }

  private static void string(Pen pen, int i, double y, double width) {
    double thick = Math.max(1, GAUGES[i] * PX_PER_INCH_OF_GAUGE * pen.em(1) / 14);
    pen.level(0, width, y, new Stroke(pen.inks().ink(), thick));
    double from = fretX(READ_FRET, width * BOARD_END) + pen.em(0.43);
    Box cell = Box.around(from + pen.em(1.36), y, pen.em(2.71), pen.em(1.29));
    pen.block(pen.inks().field(), cell);
    Stroke broken = new Stroke(pen.inks().line(), 1).broken(4, 3);
    pen.level(cell.x(), cell.right(), cell.y(), broken);
    pen.level(cell.x(), cell.right(), cell.bottom(), broken);
    pen.upright(cell.x(), cell.y(), cell.bottom(), broken);
    pen.upright(cell.right(), cell.y(), cell.bottom(), broken);
    double bridge = width * (BOARD_END + 0.06);
    double saddle = bridge + SADDLES[i] * (width - bridge);
    pen.block(pen.inks().ink(), Box.around(saddle, y, pen.em(0.43), pen.em(1.14)));
  }

  /** Between neck and bridge a piece is left out, as on a workshop drawing. */
  private static void breakLine(Pen pen, double boardEnd, double top, double bottom) {
    double left = boardEnd + pen.em(0.29);
    double right = left + pen.em(0.86);
    pen.block(pen.inks().bench(), new Box(left, top - 1, right - left, bottom - top + 1));
    double middle = (top + bottom) / 2;
    double out = pen.em(0.36);
    Stroke line = new Stroke(pen.inks().line(), 1);
    for (double x : new double[] {pen.middle(left), pen.middle(right)}) {
      pen.path(
          line,
          x,
          top - out,
          x,
          middle - 2 * out,
          x - out,
          middle - out,
          x + out,
          middle + out,
          x,
          middle + 2 * out,
          x,
          bottom);
    }
  }

  private void words(Pen pen, double width, double boardEnd) {
    double y = pen.em(0.57);
    Lettering soft = Lettering.plain(0.86, pen.inks().soft());
    pen.textAround(nut, soft, 0, y);
    pen.textAround(bridge, soft.endingThere(), width, y);
    Lettering bold = Lettering.bold(1, pen.inks().ink()).centred();
    pen.textAround(Integer.toString(READ_FRET), bold, fretX(READ_FRET, boardEnd), y);
  }
}
