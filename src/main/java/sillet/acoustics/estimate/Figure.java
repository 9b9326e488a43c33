package sillet.acoustics.estimate;

/**
 * A figure and how sure it is.
 *
 * @param value most likely value, in the figure's own unit, finite
 * @param sd standard deviation, same unit, finite and not negative
 */
public record Figure(double value, double sd) {
  /** Standard deviations either way that hold 95 % of a normal figure. */
  public static final double NINETY_FIVE = 1.959964;

  /**
   * Refuses what is no number.
   *
   * @throws IllegalArgumentException if value or sd is not finite, or the sd negative
   */
  public Figure {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("a figure is " + value);
    }
    if (!(sd >= 0) || Double.isInfinite(sd)) {
      throw new IllegalArgumentException("the sd of a figure is " + sd);
    }
  }

  /** Lower end of the 95 % interval. */
  public double low() {
    return value - NINETY_FIVE * sd;
  }

  /** Upper end of the 95 % interval. */
  public double high() {
    return value + NINETY_FIVE * sd;
  }
}
