package sillet.logbook.learned;

/**
 * A figure and how sure it is.
 *
 * @param value best estimate
 * @param low lower end of its 95 % interval
 * @param high upper end
 */
public record LearnedFigure(double value, double low, double high) {

  /**
   * Tells whether the figure says more than that nothing is known to be off.
   *
   * @param usual what it is on an instrument without fault
   * @return true if that lies outside the interval
   */
  public boolean differsFrom(double usual) {
    return usual < low || usual > high;
  }
}
