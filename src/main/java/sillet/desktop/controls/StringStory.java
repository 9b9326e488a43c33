package sillet.desktop.controls;

import java.util.ArrayList;
import java.util.List;
import java.util.NavigableMap;
import java.util.OptionalDouble;
import java.util.TreeMap;
import sillet.acoustics.readings.TrySpread;
import sillet.logbook.strings.FittedString;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.VisitRecord;

/**
 * One string's way through a visit: cents at fret 12 in the first and in the last pass.
 *
 * @param string the string as fitted
 * @param received cents of the first pass, the median of its tries
 * @param left cents of the last pass; empty while there is one pass only
 * @param movedSince whether its saddle or nut was moved after the last reading
 */
public record StringStory(
    FittedString string, OptionalDouble received, OptionalDouble left, boolean movedSince) {
  private static final int FRET = 12;

  /** The newest figure there is. */
  public OptionalDouble newest() {
    return left.isPresent() ? left : received;
  }

  /** All strings of a visit, in the order they are fitted. */
  public static List<StringStory> of(VisitRecord visit) {
    List<StringStory> stories = new ArrayList<>();
    for (FittedString string : visit.visit().strings().strings()) {
      stories.add(one(visit, string));
    }
    return stories;
  }

  private static StringStory one(VisitRecord visit, FittedString string) {
    NavigableMap<Integer, Double> cents = new TreeMap<>();
    for (Reading reading : visit.readings()) {
      if (reading.string() == string.number() && reading.fret() == FRET) {
        keep(cents, reading);
      }
    }
    OptionalDouble received =
        cents.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(cents.firstEntry().getValue());
    OptionalDouble left =
        cents.size() < 2 ? OptionalDouble.empty() : OptionalDouble.of(cents.lastEntry().getValue());
    return new StringStory(string, received, left, movedSince(visit, string.number(), cents));
  }

  /**
   * A newer reading of the same note takes the older one's place; one without tries takes it back.
   */
  private static void keep(NavigableMap<Integer, Double> cents, Reading reading) {
    if (reading.tries() == null) {
      cents.remove(reading.pass());
    } else {
      double median = TrySpread.of(reading.tries().values(), reading.sdCents()).median();
      cents.put(reading.pass(), median);
    }
  }

  private static boolean movedSince(
      VisitRecord visit, int string, NavigableMap<Integer, Double> cents) {
    int lastPass = cents.isEmpty() ? 0 : cents.lastKey();
    for (MadeMove move : visit.moves()) {
      if (move.string() == string && move.pass() >= lastPass) {
        return true;
      }
    }
    return false;
  }
}
