package sillet.logbook.units;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;

/**
 * Numbers as people type them: dot or comma as the decimal sign, an optional sign, no grouping.
 * {@code 1,234} could be either of two numbers and is refused instead of guessed.
 */
public final class DecimalText {
  private static final Pattern PLAIN = Pattern.compile("[+-]?(\\d+(?:[.,]\\d*)?|[.,]\\d+)");
  private static final Pattern AMBIGUOUS = Pattern.compile("[+-]?[1-9]\\d{0,2},\\d{3}");
  private static final int LONGEST = 40;

  private DecimalText() {}

  /**
   * Reads a number.
   *
   * @param text what was typed; space around it is ignored
   * @return the number, finite
   * @throws Rejection if it is no plain decimal number, or could mean two numbers
   */
  public static Decimal parse(String text) {
    String trimmed = text.strip().replace('\u2212', '-');
    Matcher matcher = PLAIN.matcher(trimmed);
    if (trimmed.length() > LONGEST || !matcher.matches()) {
      throw Rejection.of("number.none", Quoted.of(text.strip()));
    }
    if (AMBIGUOUS.matcher(trimmed).matches()) {
      String digits = trimmed.replace(",", "");
      throw Rejection.of(
          "number.ambiguous", Quoted.of(text.strip()), trimmed.replace(',', '.'), digits);
    }
    String dotted = trimmed.replace(',', '.');
    int point = dotted.indexOf('.');
    int decimals = point < 0 ? 0 : dotted.length() - point - 1;
    return new Decimal(Double.parseDouble(dotted), decimals);
  }
}
