package sillet.desktop.controls;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.DecimalText;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;

/**
 * Gauges as people say them: {@code .010}, {@code 0.010in}, {@code 10} for ten thousandths, {@code
 * 0.66mm}.
 */
public final class GaugeText {
  private static final Pattern SUFFIXED = Pattern.compile("(.*?)\\s*(mm|in|inch|\"|thou)?");

  private GaugeText() {}

  /**
   * Reads a gauge.
   *
   * @return inches
   * @throws Rejection if it is no gauge above zero
   */
  public static double parse(String typed) {
    String text = typed.strip().toLowerCase(Locale.ROOT);
    Matcher suffixed = SUFFIXED.matcher(text);
    if (!suffixed.matches()) {
      throw Rejection.of("field.gauge-none", Quoted.of(typed.strip()));
    }
    double value = number(suffixed.group(1), typed);
    if (value <= 0) {
      throw Rejection.of("field.gauge-none", Quoted.of(typed.strip()));
    }
    return inches(value, suffixed.group(2));
  }

  /** A number that could be two is said to be so; anything else is no gauge at all. */
  private static double number(String text, String typed) {
    try {
      return DecimalText.parse(text).value();
    } catch (Rejection rejected) {
      if (rejected.reason().key().equals("number.ambiguous")) {
        throw rejected;
      }
      throw Rejection.of("field.gauge-none", Quoted.of(typed.strip()));
    }
  }

  private static double inches(double value, @Nullable String suffix) {
    if (suffix == null) {
      // nobody has strings of an inch: a number from one on is meant in thousandths
      return value < 1 ? value : thousandths(value);
    }
    return switch (suffix) {
      case "mm" -> value / LengthUnit.MM_PER_INCH;
      case "thou" -> thousandths(value);
      default -> value;
    };
  }

  private static double thousandths(double value) {
    return value / 1000;
  }

  /** Says a gauge back in both units. */
  public static String said(double gaugeIn) {
    return Figures.gauge(gaugeIn)
        + " in = "
        + Figures.fixed(gaugeIn * LengthUnit.MM_PER_INCH, 2)
        + " mm";
  }
}
