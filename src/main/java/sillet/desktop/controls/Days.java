package sillet.desktop.controls;

import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Days as they are written on the screens. */
public final class Days {
  private static final DateTimeFormatter NEAR =
      DateTimeFormatter.ofPattern("EEE d MMM", Locale.ENGLISH);
  private static final DateTimeFormatter FULL =
      DateTimeFormatter.ofPattern("d MMM yyyy", Locale.ENGLISH);
  private static final DateTimeFormatter WEEKDAY =
      DateTimeFormatter.ofPattern("EEEE", Locale.ENGLISH);

  private Days() {}

  /** A day not far off: Thu 4 Dec. */
  public static String near(LocalDate day) {
    return NEAR.format(day);
  }

  /** Any day: 4 Dec 2025. */
  public static String full(LocalDate day) {
    return FULL.format(day);
  }

  /** Thursday. */
  public static String weekday(LocalDate day) {
    return WEEKDAY.format(day);
  }
}
