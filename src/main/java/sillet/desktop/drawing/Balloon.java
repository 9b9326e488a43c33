package sillet.desktop.drawing;

import java.util.Locale;

/** The number of a finding in a ring; a tick once it is dealt with. */
public final class Balloon extends Glyph {
  /** Outer radius. */
  public static final double RADIUS_EM = 0.71;

  private final int number;
  private boolean dealtWith;

  /** A finding's balloon, with its name and state for screen readers. */
  public Balloon(int number, boolean dealtWith, String says) {
    super(says);
    this.number = number;
    this.dealtWith = dealtWith;
  }

  /** Shows the finding as open or dealt with. */
  public void show(boolean nowDealtWith, String says) {
    dealtWith = nowDealtWith;
    changed(says);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    if (dealtWith) {
      MarkShape.DONE.paint(pen, width / 2, height / 2);
    } else {
      paint(pen, number, width / 2, height / 2);
    }
  }

  /** Draws an open finding's balloon around a middle. */
  public static void paint(Pen pen, int number, double x, double y) {
    double stroke = pen.atLeast(1.5, 0.12);
    pen.dot(pen.inks().sheet(), x, y, pen.em(RADIUS_EM));
    pen.ring(new Stroke(pen.inks().pencil(), stroke), x, y, pen.em(RADIUS_EM) - stroke / 2);
    Lettering type = Lettering.bold(number < 10 ? 0.93 : 0.79, pen.inks().pencil()).centred();
    pen.textAround(String.format(Locale.ROOT, "%d", number), type, x, y);
  }

  @Override
  protected double widthPx() {
    return em() * 2 * (RADIUS_EM + 0.04);
  }

  @Override
  protected double heightPx() {
    return widthPx();
  }
}
