package sillet.logbook.units;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import sillet.logbook.text.Rejection;

/**
 * A length as typed, kept in millimetres: {@code 1.6}, {@code 1.6mm}, {@code .063in}, {@code 4/64},
 * {@code 4.5/64}.
 *
 * @param mm millimetres
 * @param typed what was typed, kept because rounding would show
 */
public record Length(double mm, String typed) {
  private static final Pattern FRACTION = Pattern.compile("(.+)/(\\d+)(?:\\s*(?:in|inch|\"))?");
  private static final Pattern SUFFIXED = Pattern.compile("(.*?)\\s*(mm|in|inch|\"|thou)?");

  /**
   * Reads a length.
   *
   * @param text what was typed
   * @param usual the unit of a number without a suffix
   * @return the length
   * @throws Rejection if it is no length
   */
  public static Length parse(String text, LengthUnit usual) {
    String trimmed = text.strip().toLowerCase(Locale.ROOT);
    Matcher fraction = FRACTION.matcher(trimmed);
    if (fraction.matches()) {
      return ofFraction(fraction, text.strip());
    }
    Matcher suffixed = SUFFIXED.matcher(trimmed);
    if (!suffixed.matches()) {
      throw Rejection.of("number.none", trimmed);
    }
    double value = DecimalText.parse(suffixed.group(1)).value();
    String suffix = suffixed.group(2);
    LengthUnit unit =
        suffix == null
            ? usual
            : switch (suffix) {
              case "mm" -> LengthUnit.MM;
              case "thou" -> LengthUnit.THOUSANDTHS;
              default -> LengthUnit.INCH;
            };
    return new Length(value * unit.mm(), text.strip());
  }

  private static Length ofFraction(Matcher fraction, String typed) {
    double above = DecimalText.parse(fraction.group(1)).value();
    double below = DecimalText.parse(fraction.group(2)).value();
    if (below == 0) {
      throw Rejection.of("number.none", typed);
    }
    return new Length(above / below * LengthUnit.MM_PER_INCH, typed);
  }

  /**
   * Says this length in the unit that was not typed, so that a slip shows at once.
   *
   * @param usual the unit of a number without a suffix
   * @return inches for what was typed in millimetres, millimetres for all else
   */
  public String other(LengthUnit usual) {
    String text = typed.toLowerCase(Locale.ROOT);
    boolean metric = text.endsWith("mm") || (usual == LengthUnit.MM && text.matches("[^/a-z\"]*"));
    return other(mm, metric ? LengthUnit.MM : LengthUnit.INCH);
  }

  /**
   * Says a length in the unit that was not typed, so that a slip shows at once.
   *
   * @param mm millimetres
   * @param usual the shop's own unit
   * @return inches for a shop that works in millimetres, millimetres for all others
   */
  public static String other(double mm, LengthUnit usual) {
    return usual == LengthUnit.MM
        ? Figures.fixed(mm / LengthUnit.MM_PER_INCH, 3) + " in"
        : Figures.fixed(mm, 2) + " mm";
  }
}
