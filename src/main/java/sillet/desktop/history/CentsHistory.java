package sillet.desktop.history;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sillet.desktop.controls.StringStory;
import sillet.logbook.visits.VisitRecord;

/**
 * One string's cents at fret 12 over the visits, oldest first.
 *
 * @param string number
 * @param points one for each visit in which it was read
 */
record CentsHistory(int string, List<Point> points) {
  /**
   * One visit.
   *
   * @param day taken in
   * @param ticket of the visit
   * @param received cents of the first pass
   * @param left cents of the last pass; empty where it was read once only
   */
  record Point(LocalDate day, int ticket, double received, OptionalDouble left) {}

  CentsHistory {
    points = List.copyOf(points);
  }

  static CentsHistory of(int string, List<VisitRecord> oldestFirst) {
    List<Point> points = new ArrayList<>();
    for (VisitRecord visit : oldestFirst) {
      for (StringStory story : StringStory.of(visit)) {
        if (story.string().number() == string && story.received().isPresent()) {
          LocalDate day = visit.visit().arrival().takenIn();
          double received = story.received().getAsDouble();
          points.add(new Point(day, visit.visit().ticket(), received, story.left()));
        }
      }
    }
    return new CentsHistory(string, points);
  }
}
