package sillet.desktop.visit.made;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.DecimalText;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/**
 * The size of a move as typed: turns as {@code 3 3/4} or {@code 3.75}, or a length with its unit as
 * {@code 1.9mm}. The direction is never typed as a sign.
 *
 * @param mm millimetres, zero or more
 * @param turns of the screw; null where a length was typed
 */
public record MoveText(double mm, @Nullable Double turns) {
  private static final Pattern TURNS =
      Pattern.compile("(?:(\\d+)\\s+)?(\\d+)\\s*/\\s*(\\d+)|(\\S+)");
  private static final Pattern LENGTH = Pattern.compile(".*(mm|in|inch|\"|thou)");

  /**
   * Reads the size of a move.
   *
   * @param typed what was typed, not blank
   * @param screwMm way per turn; null where there is no screw, then a bare number is a length
   * @param usual the shop's unit
   * @throws Rejection if it is no size
   */
  public static MoveText parse(String typed, @Nullable Double screwMm, LengthUnit usual) {
    String text = typed.strip().toLowerCase(Locale.ROOT);
    if (screwMm == null || LENGTH.matcher(text).matches()) {
      return new MoveText(notNegative(Length.parse(text, usual).mm(), typed), null);
    }
    Matcher turns = TURNS.matcher(text);
    if (!turns.matches()) {
      throw Rejection.of("visit.made.none", Quoted.of(typed.strip()));
    }
    double count = turns.group(4) == null ? fraction(turns, typed) : number(turns.group(4), typed);
    return new MoveText(count * screwMm, count);
  }

  private static double fraction(Matcher parts, String typed) {
    double whole = parts.group(1) == null ? 0 : DecimalText.parse(parts.group(1)).value();
    double below = DecimalText.parse(parts.group(3)).value();
    if (below == 0) {
      throw Rejection.of("visit.made.none", Quoted.of(typed.strip()));
    }
    return whole + DecimalText.parse(parts.group(2)).value() / below;
  }

  private static double number(String text, String typed) {
    return notNegative(DecimalText.parse(text).value(), typed);
  }

  private static double notNegative(double value, String typed) {
    if (value < 0) {
      throw Rejection.of("visit.made.sign", Quoted.of(typed.strip()));
    }
    return value;
  }
}
