package sillet.desktop.bench;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import org.jspecify.annotations.Nullable;

/**
 * The days of the bench: each near day is a group, what is late is one, what is far off is one.
 *
 * @param kind which
 * @param day the promised day; for late and later ones the first of the group; null for none given
 */
record DayGroup(Kind kind, @Nullable LocalDate day) {
  /** How far off a promised day is. */
  enum Kind {
    LATE,
    TODAY,
    TOMORROW,
    THIS_WEEK,
    LATER,
    NO_DAY
  }

  private static final int NEAR_DAYS = 6;

  static Kind kind(@Nullable LocalDate promised, LocalDate today) {
    if (promised == null) {
      return Kind.NO_DAY;
    }
    long days = ChronoUnit.DAYS.between(today, promised);
    if (days < 0) {
      return Kind.LATE;
    }
    if (days == 0) {
      return Kind.TODAY;
    }
    return days == 1 ? Kind.TOMORROW : days <= NEAR_DAYS ? Kind.THIS_WEEK : Kind.LATER;
  }

  /** Whether a visit promised for a day belongs to this group. */
  boolean holds(Kind otherKind, @Nullable LocalDate promised) {
    return kind == otherKind
        && (kind != Kind.THIS_WEEK || promised == null || promised.equals(day));
  }
}
