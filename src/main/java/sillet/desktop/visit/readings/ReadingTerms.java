package sillet.desktop.visit.readings;

import java.util.List;
import sillet.acoustics.readings.Reference;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.visits.Reading;

/**
 * How the readings of this sitting are taken.
 *
 * @param against what the notes are compared with
 * @param sdCents standard deviation of one reading, cents
 */
public record ReadingTerms(Reference against, double sdCents) {
  /** Against the open string, with the usual scatter. */
  public static final ReadingTerms USUAL =
      new ReadingTerms(Reference.OPEN, NoteReadings.USUAL_SD_CENTS);

  /** As it was done last time in this visit. */
  public static ReadingTerms lastOf(List<Reading> readings) {
    if (readings.isEmpty()) {
      return USUAL;
    }
    Reading last = readings.get(readings.size() - 1);
    return new ReadingTerms(last.against(), last.sdCents());
  }
}
