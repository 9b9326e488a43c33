package sillet.desktop.drawing;

/** The dotted tear line of a ticket stub, with a half-round notch at either end. */
public final class Perforation extends Drawn {
  private static final double NOTCH_EM = 0.36;

  /** An ornament; it says nothing to a screen reader. */
  public Perforation() {
    setMouseTransparent(true);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double x = pen.middle(width / 2);
    double notch = pen.em(NOTCH_EM);
    pen.dot(pen.inks().bench(), x, 0, notch);
    pen.dot(pen.inks().bench(), x, height, notch);
    Stroke dotted = new Stroke(pen.inks().line(), 1).broken(1, pen.em(0.29));
    pen.upright(x, notch + pen.em(0.21), height - notch, dotted);
  }

  @Override
  protected double computePrefWidth(double height) {
    return Math.ceil(em() * 2 * NOTCH_EM);
  }

  @Override
  protected double computeMinWidth(double height) {
    return computePrefWidth(height);
  }
}
