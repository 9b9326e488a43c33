package sillet.logbook.units;

import java.util.ArrayList;
import java.util.List;
import sillet.logbook.text.Rejection;

/**
 * One note read once or several times, in cents, as typed: {@code 3.1}, {@code 3.1/2.8/3.3} or
 * {@code 3.1 2.8 3.3}.
 *
 * @param cents the tries in the order they were read, at least one
 */
public record Tries(List<Decimal> cents) {
  private static final double FARTHEST_CENTS = 100;

  /** Copies the tries. */
  public Tries {
    cents = List.copyOf(cents);
    if (cents.isEmpty()) {
      throw new IllegalArgumentException("a reading has at least one try");
    }
  }

  /**
   * Reads a cell.
   *
   * @param text one or several numbers, divided by spaces or slashes
   * @return the tries
   * @throws Rejection if one of them is no number or lies more than 100 cents off
   */
  public static Tries parse(String text) {
    List<Decimal> tries = new ArrayList<>();
    for (String part : text.strip().split("\\s*/\\s*|\\s+", -1)) {
      Decimal one = DecimalText.parse(part);
      if (Math.abs(one.value()) > FARTHEST_CENTS) {
        throw Rejection.of("cents.too-far", part);
      }
      tries.add(one);
    }
    return new Tries(tries);
  }

  /**
   * The bare values.
   *
   * @return cents, in the order read
   */
  public double[] values() {
    return cents.stream().mapToDouble(Decimal::value).toArray();
  }

  /**
   * What rounding adds, by the finest try: a tuner that once showed a tenth shows tenths.
   *
   * @return standard deviation in cents
   */
  public double roundingSd() {
    return cents.stream().mapToDouble(Decimal::roundingSd).min().orElseThrow();
  }

  /**
   * The tries as they are written into a file.
   *
   * @return for instance {@code 3.1/2.8/3.3}
   */
  public String written() {
    List<String> parts = new ArrayList<>();
    for (Decimal one : cents) {
      parts.add(Figures.fixed(one.value(), one.decimals()));
    }
    return String.join("/", parts);
  }
}
