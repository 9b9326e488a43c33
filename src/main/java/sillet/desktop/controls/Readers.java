package sillet.desktop.controls;

import java.util.function.Function;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.DecimalText;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Tries;

/** How the texts of fields are read. Each reader throws a {@link Rejection} it can explain. */
public final class Readers {
  private Readers() {}

  /** Words, without the blanks around them. */
  public static Function<String, String> words() {
    return String::strip;
  }

  /** A length with or without its unit; without one it is in the shop's. */
  public static Function<String, Length> length(LengthUnit usual) {
    return text -> Length.parse(text, usual);
  }

  /** One or several tries of a reading, in cents. */
  public static Function<String, Tries> tries() {
    return Tries::parse;
  }

  /** A number with a decimal comma or dot. */
  public static Function<String, Double> number() {
    return text -> DecimalText.parse(text).value();
  }

  /**
   * A number between two limits, both allowed.
   *
   * @param low the lowest, as a person writes it
   * @param high the highest, as a person writes it
   * @param unit what it is counted in
   */
  public static Function<String, Double> number(String low, String high, String unit) {
    double lowest = DecimalText.parse(low).value();
    double highest = DecimalText.parse(high).value();
    return text -> {
      double value = DecimalText.parse(text).value();
      if (value < lowest || value > highest) {
        throw Rejection.of("field.between", low, high, unit, Quoted.of(text.strip()));
      }
      return value;
    };
  }

  /**
   * A whole number between two limits, both allowed.
   *
   * @param low the lowest
   * @param high the highest
   * @param unit what is counted
   */
  public static Function<String, Integer> whole(int low, int high, String unit) {
    return text -> {
      double value = DecimalText.parse(text).value();
      if (value < low || value > high) {
        String lowest = Integer.toString(low);
        String highest = Integer.toString(high);
        throw Rejection.of("field.between", lowest, highest, unit, Quoted.of(text.strip()));
      }
      if (value != Math.rint(value)) {
        throw Rejection.of("field.whole", Quoted.of(text.strip()));
      }
      return (int) value;
    };
  }
}
