package sillet.acoustics.estimate;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;

/** The true notes of one string, fret by fret. */
final class NotesNow {
  /** Frets of which notes are kept. */
  static final int FRETS = 24;

  private static final int[] ALL_FRETS = allFrets();

  private final NoteEstimate[] notes = new NoteEstimate[FRETS + 1];

  private NotesNow() {}

  private static int[] allFrets() {
    int[] frets = new int[FRETS];
    Arrays.setAll(frets, i -> i + 1);
    return frets;
  }

  /** Null where a note is none. */
  static @Nullable NotesNow of(Solution solution, OccasionModel now) {
    double[] quantities = now.quantities(solution.point(), solution.sds());
    SlopesByQuantity curve =
        SlopesByQuantity.of(now, quantities, solution.sds(), ALL_FRETS, Reference.OPEN);
    if (curve == null) {
      return null;
    }
    StringSituation situation = now.situation(quantities, solution.frets());
    NotesNow all = new NotesNow();
    for (int fret = 1; fret <= FRETS; fret++) {
      double[] slopes = new double[solution.point().length];
      curve.chain(fret - 1, now, solution.sds(), slopes);
      double cents = curve.cents(fret - 1) + situation.placeCents(fret);
      cents += solution.model().body(now, fret, solution.point(), solution.sds(), slopes);
      double own = solution.placeVariance(fret, situation.centsPerMetreOfPlace(fret), slopes);
      all.notes[fret] = solution.withReadings(new NoteEstimate(cents, slopes, own), now, fret);
    }
    return all;
  }

  NoteEstimate at(int fret) {
    return notes[fret];
  }
}
