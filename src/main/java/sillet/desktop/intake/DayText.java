package sillet.desktop.intake;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;

/**
 * Days as they are typed at a counter: {@code 2026-12-04}, {@code 4.12.2026}, {@code 4.12.} for the
 * next such day, {@code +3} for three days from today and {@code -7} for a week ago.
 */
public final class DayText {
  private static final Pattern FROM_TODAY = Pattern.compile("([+\u2212-])(\\d{1,4})");
  private static final Pattern ISO = Pattern.compile("(\\d{4})-(\\d{1,2})-(\\d{1,2})");
  private static final Pattern DOTTED =
      Pattern.compile("(\\d{1,2})\\.\\s*(\\d{1,2})\\.?\\s*(\\d{4})?");
  private static final DateTimeFormatter SAID =
      DateTimeFormatter.ofPattern("EEE d MMM uuuu", Locale.ENGLISH);

  private DayText() {}

  /**
   * Reads a day.
   *
   * @param typed what was typed
   * @param today what relative days are counted from
   * @throws Rejection if it is no day
   */
  public static LocalDate parse(String typed, LocalDate today) {
    String text = typed.strip();
    try {
      Matcher fromToday = FROM_TODAY.matcher(text);
      if (fromToday.matches()) {
        int days = Integer.parseInt(fromToday.group(2));
        return today.plusDays(fromToday.group(1).equals("+") ? days : -days);
      }
      Matcher iso = ISO.matcher(text);
      if (iso.matches()) {
        return day(iso.group(1), iso.group(2), iso.group(3));
      }
      Matcher dotted = DOTTED.matcher(text);
      if (dotted.matches()) {
        return dotted(dotted, today);
      }
    } catch (DateTimeException notInTheCalendar) {
      throw Rejection.of("intake.day.none", Quoted.of(text));
    }
    throw Rejection.of("intake.day.none", Quoted.of(text));
  }

  private static LocalDate dotted(Matcher parts, LocalDate today) {
    String year = parts.group(3);
    if (year != null) {
      return day(year, parts.group(2), parts.group(1));
    }
    LocalDate thisYear = day(Integer.toString(today.getYear()), parts.group(2), parts.group(1));
    return thisYear.isBefore(today) ? thisYear.plusYears(1) : thisYear;
  }

  private static LocalDate day(String year, String month, String day) {
    return LocalDate.of(Integer.parseInt(year), Integer.parseInt(month), Integer.parseInt(day));
  }

  /** Says a day with its weekday. */
  public static String said(LocalDate day) {
    return SAID.format(day);
  }
}
