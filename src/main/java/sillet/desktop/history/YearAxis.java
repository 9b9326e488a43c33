package sillet.desktop.history;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;

/**
 * The time axis all plots share: whole years, from the first visit's to the last one's.
 *
 * @param first day of the first year
 * @param end first day after the last year
 */
record YearAxis(LocalDate first, LocalDate end) {

  /** The axis of these days; of the given year where there are none. */
  static YearAxis over(List<LocalDate> days, LocalDate today) {
    LocalDate earliest = days.stream().min(LocalDate::compareTo).orElse(today);
    LocalDate latest = days.stream().max(LocalDate::compareTo).orElse(today);
    return new YearAxis(earliest.withDayOfYear(1), latest.withDayOfYear(1).plusYears(1));
  }

  /** Where a day lies, 0 at the first and 1 at the end. */
  double share(LocalDate day) {
    return ChronoUnit.DAYS.between(first, day) / (double) ChronoUnit.DAYS.between(first, end);
  }

  /** The first days of the years that begin on the axis, at most as many as asked for. */
  List<LocalDate> years(int most) {
    int count = end.getYear() - first.getYear();
    int step = (count + most - 1) / most;
    List<LocalDate> years = new ArrayList<>();
    for (LocalDate year = first; year.isBefore(end); year = year.plusYears(step)) {
      years.add(year);
    }
    return years;
  }
}
