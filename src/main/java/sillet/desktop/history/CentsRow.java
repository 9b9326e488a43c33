package sillet.desktop.history;

import java.time.LocalDate;
import java.util.OptionalDouble;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/**
 * One string's row of the plot: its own zero line, an open dot as received, a full dot as left, the
 * two joined; a bar hangs at the visit that is looked at. Beyond ten cents a dot stays at the edge.
 */
final class CentsRow extends DrawnBand {
  private static final double MOST_CENTS = 10;
  private static final double APART_EM = 0.5;
  private static final double RADIUS_EM = 0.29;
  private static final int MOST_YEARS = 8;

  private final CentsHistory history;
  private final YearAxis axis;
  private final int chosenTicket;

  CentsRow(CentsHistory history, YearAxis axis, int chosenTicket) {
    super(20, 6, 2.43);
    this.history = history;
    this.axis = axis;
    this.chosenTicket = chosenTicket;
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    for (LocalDate year : axis.years(MOST_YEARS)) {
      pen.upright(x(year, width), 0, height, new Stroke(pen.inks().hair(), 1));
    }
    pen.level(0, width, height / 2, new Stroke(pen.inks().line(), 1));
    for (CentsHistory.Point point : history.points()) {
      point(pen, point, width, height);
    }
  }

  private void point(Pen pen, CentsHistory.Point point, double width, double height) {
    double apart = pen.em(APART_EM);
    double middle = Math.max(2 * apart, Math.min(width - 2 * apart, x(point.day(), width)));
    if (point.ticket() == chosenTicket) {
      Box band = Box.around(middle, height / 2, pen.em(2.29), height);
      pen.block(pen.inks().bench(), band);
      Stroke edge = new Stroke(pen.inks().hair(), 1);
      pen.upright(band.x(), 0, height, edge);
      pen.upright(band.right(), 0, height, edge);
      pen.level(band.x(), band.right(), height / 2, new Stroke(pen.inks().line(), 1));
    }
    double receivedY = y(point.received(), pen, height);
    OptionalDouble left = point.left();
    double receivedX = left.isPresent() ? middle - apart : middle;
    if (left.isPresent()) {
      double leftY = y(left.getAsDouble(), pen, height);
      Stroke joined = new Stroke(pen.inks().ink(), pen.atLeast(1, 0.08));
      pen.line(receivedX, receivedY, middle + apart, leftY, joined);
      pen.dot(pen.inks().ink(), middle + apart, leftY, pen.em(RADIUS_EM));
    }
    double stroke = pen.atLeast(1.5, 0.11);
    pen.dot(pen.inks().sheet(), receivedX, receivedY, pen.em(RADIUS_EM));
    pen.ring(
        new Stroke(pen.inks().ink(), stroke), receivedX, receivedY, pen.em(RADIUS_EM) - stroke / 2);
  }

  private double x(LocalDate day, double width) {
    return axis.share(day) * width;
  }

  /** Sharp lies above the line. */
  private static double y(double cents, Pen pen, double height) {
    double reach = height / 2 - pen.em(RADIUS_EM + 0.07);
    double clamped = Math.max(-MOST_CENTS, Math.min(MOST_CENTS, cents));
    return height / 2 - clamped / MOST_CENTS * reach;
  }
}
