package sillet.logbook.units;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * Figures written with a fixed count of decimals, dot as the sign, never in powers of ten and never
 * as minus zero.
 */
public final class Figures {
  private Figures() {}

  /**
   * Writes a figure for a file.
   *
   * @param value any finite number
   * @param decimals digits after the dot
   * @return for instance {@code -1.860}
   */
  public static String fixed(double value, int decimals) {
    BigDecimal rounded = new BigDecimal(value).setScale(decimals, RoundingMode.HALF_UP);
    return (rounded.signum() == 0 ? BigDecimal.ZERO.setScale(decimals) : rounded).toPlainString();
  }

  /**
   * Writes a gauge as the packet prints it.
   *
   * @param gaugeIn inches
   * @return for instance {@code .010}, without the zero before the dot; finer than a thousandth
   *     only where it is
   */
  public static String gauge(double gaugeIn) {
    BigDecimal exact = BigDecimal.valueOf(gaugeIn).stripTrailingZeros();
    BigDecimal shown =
        exact.scale() < 3
            ? exact.setScale(3)
            : exact.setScale(Math.min(exact.scale(), 4), RoundingMode.HALF_UP);
    String text = shown.toPlainString();
    return text.startsWith("0.") ? text.substring(1) : text;
  }

  /**
   * Writes cents for people: always with a sign, the minus as a true minus.
   *
   * @param cents positive is sharp
   * @param decimals digits after the dot
   * @return for instance {@code +5.0} or a minus and {@code 2.6}; zero has no sign
   */
  public static String signed(double cents, int decimals) {
    String text = fixed(cents, decimals);
    if (text.startsWith("-")) {
      return '\u2212' + text.substring(1);
    }
    return new BigDecimal(text).signum() == 0 ? text : '+' + text;
  }
}
