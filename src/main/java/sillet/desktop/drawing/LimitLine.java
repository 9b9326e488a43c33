package sillet.desktop.drawing;

import org.jspecify.annotations.Nullable;

/**
 * A check's figures against the shop target: uprights at the limits, an open dot as received, a
 * full dot as left. Values past the limits run to the ends of the line and stay there.
 */
public final class LimitLine extends Glyph {
  /**
   * What stands on the line, all in one unit; null where not known or not set.
   *
   * @param low lower limit
   * @param high upper limit
   * @param received the figure as received
   * @param left the figure as left
   */
  public record Values(
      @Nullable Double low,
      @Nullable Double high,
      @Nullable Double received,
      @Nullable Double left) {
    boolean hasTarget() {
      return low != null || high != null;
    }

    boolean outside(double value) {
      return (low != null && value < low) || (high != null && value > high);
    }

    private double lowEnd() {
      return low != null ? low : high != null ? Math.min(0, high) : 0;
    }

    private double highEnd() {
      return high != null ? high : lowEnd() + Math.max(1e-9, Math.abs(lowEnd()));
    }

    /** Place on the line, 0 to 1; the limits stand at a third and at two thirds. */
    double place(double value) {
      double span = Math.max(1e-9, highEnd() - lowEnd());
      return Math.max(0.06, Math.min(0.94, (1 + (value - lowEnd()) / span) / 3));
    }
  }

  private static final double WIDTH_EM = 6.86;
  private static final double UPRIGHT_EM = 1.0;

  private Values values;

  /** A line with its state in words for screen readers. */
  public LimitLine(Values values, String says) {
    super(says);
    this.values = values;
  }

  /** Shows other figures. */
  public void show(Values newValues, String says) {
    values = newValues;
    changed(says);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double y = pen.middle(height / 2);
    pen.level(0, width, y, new Stroke(pen.inks().line(), 1));
    limit(pen, values.low(), width, y);
    limit(pen, values.high(), width, y);
    if (values.received() != null) {
      double x = x(values.received(), width);
      pen.dot(pen.inks().sheet(), x, y, pen.em(0.29));
      pen.ring(new Stroke(pen.inks().ink(), pen.atLeast(1.3, 0.1)), x, y, pen.em(0.25));
    }
    if (values.left() != null) {
      boolean outside = values.outside(values.left());
      double x = x(values.left(), width);
      pen.dot(outside ? pen.inks().pencil() : pen.inks().ink(), x, y, pen.em(0.29));
    }
  }

  private double x(double value, double width) {
    return values.hasTarget() ? values.place(value) * width : width / 2;
  }

  private void limit(Pen pen, @Nullable Double limit, double width, double y) {
    if (limit != null) {
      double half = pen.em(UPRIGHT_EM / 2);
      Stroke stroke = new Stroke(pen.inks().ink(), pen.atLeast(2, 0.14));
      pen.upright(x(limit, width), y - half, y + half, stroke);
    }
  }

  @Override
  protected double widthPx() {
    return em() * WIDTH_EM;
  }

  @Override
  protected double heightPx() {
    return em() * 1.29;
  }
}
