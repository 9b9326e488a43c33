package sillet.desktop.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sillet.desktop.controls.StringStory;
import sillet.logbook.visits.VisitRecord;

/**
 * One open visit.
 *
 * @param visit all of it
 * @param group the day it belongs under
 * @param strings how far each string is
 */
record BenchRow(VisitRecord visit, DayGroup group, List<StringState> strings) {
  private static final double NEAR_ENOUGH_CENTS = 1;

  BenchRow {
    strings = List.copyOf(strings);
  }

  static BenchRow of(VisitRecord visit, DayGroup group) {
    List<StringState> strings = new ArrayList<>();
    for (StringStory story : StringStory.of(visit)) {
      strings.add(state(story));
    }
    return new BenchRow(visit, group, strings);
  }

  int ticket() {
    return visit.visit().ticket();
  }

  String customer() {
    return visit.customer() == null ? "" : visit.customer().name();
  }

  String request() {
    return visit.visit().arrival().request();
  }

  int count(StringState state) {
    return (int) strings.stream().filter(one -> one == state).count();
  }

  /** What comes next: the first of these that any string asks for. */
  StringState next() {
    for (StringState asks : List.of(StringState.READ_AGAIN, StringState.OFF, StringState.UNREAD)) {
      if (strings.contains(asks)) {
        return asks;
      }
    }
    return strings.isEmpty() ? StringState.UNREAD : StringState.NEAR;
  }

  private static StringState state(StringStory story) {
    OptionalDouble cents = story.newest();
    if (cents.isEmpty()) {
      return StringState.UNREAD;
    }
    if (story.movedSince()) {
      return StringState.READ_AGAIN;
    }
    return Math.abs(cents.getAsDouble()) <= NEAR_ENOUGH_CENTS ? StringState.NEAR : StringState.OFF;
  }
}
