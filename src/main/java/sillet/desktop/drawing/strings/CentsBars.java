package sillet.desktop.drawing.strings;

import javafx.scene.paint.Color;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Snap;
import sillet.desktop.drawing.Stroke;

/**
 * Draws readings on their fret lines: a bar from the string's edge, up for sharp and down for flat;
 * a diamond within a cent; an arrowhead beyond ten; a tick in pencil for what is predicted. What
 * the model only estimates is drawn thin.
 */
public final class CentsBars {
  /** Bars end here; beyond stands an arrowhead. */
  static final double MOST_CENTS = 10;

  private static final double BAR_EM = 0.64;
  private static final double HEAD_EM = 0.5;
  private static final double HEAD_GAP_EM = 0.14;

  /** Sizes of a mark in em, and the least width of its lines in px. */
  private record Weight(double bar, double diamond, double tick, double line, double leastPx) {
    static final Weight READ = new Weight(BAR_EM, 0.47, 0.64, 0.14, 2);
    static final Weight ESTIMATED = new Weight(0.18, 0.32, 0.43, 0.07, 1);

    static Weight of(FretMark mark) {
      return mark.estimated() ? ESTIMATED : READ;
    }
  }

  private final Pen pen;
  private final double cent;

  /** Bars of which one cent is so many em long. */
  public CentsBars(Pen pen, double centEm) {
    this.pen = pen;
    this.cent = pen.em(centEm);
  }

  /** All readings of a sheet. */
  static void paint(Pen pen, SheetGeometry sheet, double[] widths) {
    CentsBars bars = new CentsBars(pen, sheet.measures().cent());
    for (int row = 0; row < widths.length; row++) {
      for (FretMark mark : sheet.picture().rows().get(row).frets()) {
        double x = sheet.strip().fretX(row, mark.fret());
        bars.paint(mark, x, sheet.rows().y(row), widths[row]);
      }
    }
  }

  /** One mark on a string so many px thick. */
  public void paint(FretMark mark, double x, double y, double stringWidth) {
    double lineX = pen.middle(x);
    if (mark.before() != null && !FretMark.isTrue(mark.before())) {
      openBar(mark.before(), lineX, y, stringWidth);
    }
    Double cents = mark.cents();
    if (cents != null) {
      reading(mark, cents, lineX, y, stringWidth);
    }
    Double predicted = mark.predicted();
    boolean diamondStays = FretMark.isTrue(cents) && FretMark.isTrue(predicted);
    if (predicted != null && !mark.stale() && !diamondStays) {
      tick(predicted, Weight.of(mark), lineX, y, stringWidth);
    }
  }

  private void reading(FretMark mark, double cents, double x, double y, double stringWidth) {
    Color colour = mark.stale() ? pen.inks().line() : pen.inks().ink();
    Weight weight = Weight.of(mark);
    if (FretMark.isTrue(cents)) {
      diamond(new Stroke(colour, width(weight)), weight, mark.stale() ? colour : null, x, y);
      return;
    }
    double side = -Math.signum(cents);
    double foot = y + side * stringWidth / 2;
    double length = Math.min(MOST_CENTS, Math.abs(cents)) * cent;
    boolean beyond = Math.abs(cents) > MOST_CENTS;
    double head = beyond ? pen.em(HEAD_EM + HEAD_GAP_EM) : 0;
    double end = foot + side * Math.max(1, length - head);
    double bar = mark.estimated() ? pen.atLeast(2, weight.bar()) : pen.em(weight.bar());
    pen.block(colour, Box.between(x - bar / 2, foot, bar, end));
    if (beyond) {
      double neck = pen.edge(end + side * pen.em(HEAD_GAP_EM));
      double tip = neck + side * pen.em(HEAD_EM);
      double half = pen.em(mark.estimated() ? 0.29 : 0.4);
      pen.area(colour, x - half, neck, x, tip, x + half, neck);
    }
  }

  private void openBar(double cents, double x, double y, double stringWidth) {
    double side = -Math.signum(cents);
    double foot = y + side * stringWidth / 2;
    double end = foot + side * Math.min(MOST_CENTS, Math.abs(cents)) * cent;
    Stroke stroke = new Stroke(pen.inks().line(), 1);
    double width = 2 * Snap.px(pen.em(BAR_EM) / 2) + 1;
    pen.openBlock(stroke, Color.TRANSPARENT, Box.between(x - width / 2, foot, width, end));
  }

  private double width(Weight weight) {
    return pen.atLeast(weight.leastPx(), weight.line());
  }

  private void diamond(Stroke stroke, Weight weight, @Nullable Color filled, double x, double y) {
    double half = pen.em(weight.diamond());
    Color ground = filled == null ? pen.inks().field() : filled;
    pen.area(ground, x - half, y, x, y - half, x + half, y, x, y + half);
    double inset = half - stroke.width() * 0.7;
    pen.outlined(stroke, x - inset, y, x, y - inset, x + inset, y, x, y + inset);
  }

  /** Stands where a bar of so many cents would end; between the string's edges near zero. */
  private void tick(double cents, Weight weight, double x, double y, double stringWidth) {
    double held = Math.max(-MOST_CENTS, Math.min(MOST_CENTS, cents));
    double foot = y - Math.max(-1, Math.min(1, cents)) * stringWidth / 2;
    double half = pen.em(weight.tick());
    Stroke stroke = new Stroke(pen.inks().pencil(), pen.atLeast(2, 0.13));
    pen.level(x - half, x + half, foot - held * cent, stroke);
  }
}
