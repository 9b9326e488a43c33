package sillet.desktop.drawing.strings;

import java.util.Locale;
import java.util.Set;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Snap;
import sillet.desktop.drawing.Stroke;

/** Draws the board: nut, frets, edges, inlays to find one's place, and the fret numbers. */
final class BoardLines {
  private static final Set<Integer> SINGLE_DOTS = Set.of(3, 5, 7, 9, 15, 17, 19, 21);
  private static final Set<Integer> DOUBLE_DOTS = Set.of(12, 24);
  private static final double DOT_EM = 0.29;
  private static final double[] NUMBER_SIZES = {1.14, 1, 0.93};
  private static final double LEAST_NUMBER = 0.86;
  private static final double NUMBER_GAP_EM = 0.29;

  private final Pen pen;
  private final SheetGeometry sheet;
  private final NeckStripGeometry strip;
  private final int frets;

  BoardLines(Pen pen, SheetGeometry sheet) {
    this.pen = pen;
    this.sheet = sheet;
    this.strip = sheet.strip();
    this.frets = sheet.picture().board().frets();
  }

  void paint() {
    inlays();
    Stroke thin = new Stroke(pen.inks().line(), 1);
    double top = sheet.rows().top();
    double bottom = sheet.rows().bottom();
    for (int fret = 1; fret <= frets; fret++) {
      fret(fret, thin, top, bottom);
    }
    double nutTop = strip.neckFretXAt(0, top);
    double nutBottom = strip.neckFretXAt(0, bottom);
    double end = sheet.boardEnd();
    pen.level(nutTop, end, top, thin);
    pen.level(nutBottom, end, bottom, thin);
    nut(nutTop, nutBottom);
    shortNuts();
  }

  private void fret(int fret, Stroke thin, double top, double bottom) {
    double upper = strip.neckFretXAt(fret, top);
    double lower = strip.neckFretXAt(fret, bottom);
    if (Math.abs(upper - lower) < 0.01) {
      pen.upright(upper, top, bottom, thin);
    } else {
      pen.line(upper, top, lower, bottom, thin);
    }
  }

  private void nut(double upper, double lower) {
    double width = -sheet.away() * Snap.px(pen.em(SheetGeometry.NUT_EM));
    double top = sheet.rows().top();
    double bottom = sheet.rows().bottom() + 1;
    pen.area(
        pen.inks().ink(),
        pen.edge(upper),
        top,
        pen.edge(upper) + width,
        top,
        pen.edge(lower) + width,
        bottom,
        pen.edge(lower),
        bottom);
  }

  /** A string with a nut of its own begins at a fret of the neck. */
  private void shortNuts() {
    for (int row = 0; row < sheet.rows().count(); row++) {
      if (sheet.picture().rows().get(row).startFret() > 0) {
        double width = pen.em(SheetGeometry.NUT_EM);
        double x = strip.fretX(row, 0) - sheet.away() * width / 2;
        pen.block(pen.inks().ink(), Box.around(x, sheet.rows().y(row), width, pen.em(1)));
      }
    }
  }

  private void inlays() {
    int gaps = sheet.rows().count() - 1;
    if (gaps < 1) {
      return;
    }
    int middle = (gaps - 1) / 2;
    int apart = Math.max(1, (int) Snap.px((gaps + 1) / 6.0));
    for (int fret = 1; fret <= frets; fret++) {
      if (SINGLE_DOTS.contains(fret)) {
        dot(fret, middle);
      } else if (DOUBLE_DOTS.contains(fret)) {
        dot(fret, Math.max(0, middle - apart));
        dot(fret, Math.min(gaps - 1, gaps - 1 - middle + apart));
      }
    }
  }

  private void dot(int fret, int gap) {
    double y = (sheet.rows().y(gap) + sheet.rows().y(gap + 1)) / 2;
    double x = (strip.neckFretXAt(fret - 1, y) + strip.neckFretXAt(fret, y)) / 2;
    pen.dot(pen.inks().hair(), x, y, pen.em(DOT_EM));
  }

  /** Numbers above the frets: the read ones bold, others where there is room. */
  void paintNumbers(SheetWords words, TakenRoom taken) {
    Lettering read = readNumbers();
    Lettering other = Lettering.plain(0.86, pen.inks().soft()).centred();
    double y = sheet.headLineY();
    double top = sheet.rows().top();
    for (int fret : sheet.picture().board().readFrets()) {
      double x = strip.neckFretXAt(fret, top);
      taken.take(x, pen.em(read.width(number(fret), 1)));
      pen.textAround(number(fret), read, x, y);
    }
    for (int fret = frets; fret >= 1; fret--) {
      boolean dotted = SINGLE_DOTS.contains(fret) || DOUBLE_DOTS.contains(fret);
      boolean named = dotted || fret == frets || sheet.column();
      double x = strip.neckFretXAt(fret, top);
      if (named && taken.takeIfFree(x, pen.em(1.14), pen.em(0.29))) {
        pen.textAround(number(fret), other, x, y);
      }
    }
    double nut = strip.neckFretXAt(0, top);
    double width = other.width(words.nut(), pen.em(1));
    if (taken.takeIfFree(nut, width, pen.em(0.43))) {
      pen.textAround(words.nut(), other, nut, y);
    }
  }

  /** The largest type in which no number of a read fret touches its neighbour's. */
  private Lettering readNumbers() {
    for (double size : NUMBER_SIZES) {
      Lettering type = Lettering.bold(size, pen.inks().ink()).centred();
      if (free(type)) {
        return type;
      }
    }
    return Lettering.bold(LEAST_NUMBER, pen.inks().ink()).centred();
  }

  private boolean free(Lettering type) {
    TakenRoom taken = new TakenRoom();
    return sheet.picture().board().readFrets().stream()
        .allMatch(
            fret ->
                taken.takeIfFree(
                    strip.neckFretXAt(fret, sheet.rows().top()),
                    type.width(number(fret), pen.em(1)),
                    pen.em(NUMBER_GAP_EM)));
  }

  private static String number(int fret) {
    return String.format(Locale.ROOT, "%d", fret);
  }
}
