package sillet.desktop.forecast;

import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.desktop.controls.GaugeText;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.StringMake;

/**
 * Another gauge as people say it: {@code .011}, or {@code 20w} and {@code 20p} where a plain string
 * is to become a wound one or the other way round.
 *
 * @param gaugeIn inches
 * @param construction null where it stays
 */
record NewGauge(double gaugeIn, @Nullable Construction construction) {
  private static final Pattern KIND = Pattern.compile("(.*?)\\s*([wp])?");

  /**
   * Reads a gauge.
   *
   * @param typed what was typed
   * @param strings those on the instrument: a wound string is made like their wound ones
   * @throws sillet.logbook.text.Rejection if it is no gauge
   */
  static NewGauge parse(String typed, List<StringMake> strings) {
    Matcher parts = KIND.matcher(typed.strip().toLowerCase(Locale.ROOT));
    if (!parts.matches() || parts.group(2) == null) {
      return new NewGauge(GaugeText.parse(typed), null);
    }
    boolean wound = parts.group(2).equals("w");
    return new NewGauge(GaugeText.parse(parts.group(1)), like(strings, wound));
  }

  private static Construction like(List<StringMake> strings, boolean wound) {
    Predicate<Construction> wanted = kind -> ConstructionWords.wound(kind) == wound;
    return strings.stream()
        .map(StringMake::construction)
        .filter(wanted)
        .findFirst()
        .orElseGet(() -> usual(strings, wound));
  }

  private static Construction usual(List<StringMake> strings, boolean wound) {
    boolean nylon =
        strings.stream()
            .map(StringMake::construction)
            .anyMatch(kind -> kind == Construction.PLAIN_NYLON || kind == Construction.WOUND_NYLON);
    if (nylon) {
      return wound ? Construction.WOUND_NYLON : Construction.PLAIN_NYLON;
    }
    return wound ? Construction.WOUND_NICKEL : Construction.PLAIN_STEEL;
  }
}
