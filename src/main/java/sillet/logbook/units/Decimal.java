package sillet.logbook.units;

/**
 * A number with the decimals it was typed with, because {@code 5} and {@code 5.0} say different
 * things about the tuner.
 *
 * @param value the number, finite
 * @param decimals how many digits stood after the decimal sign, 0 or more
 */
public record Decimal(double value, int decimals) {

  /**
   * The standard deviation that rounding to the typed decimals adds: one step over the square root
   * of twelve.
   *
   * @return in the unit of the value
   */
  public double roundingSd() {
    return Math.pow(10, -decimals) / Math.sqrt(12);
  }
}
