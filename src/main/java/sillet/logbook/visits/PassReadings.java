package sillet.logbook.visits;

import java.util.Comparator;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.units.Tries;

/** The readings of a visit as they count: of each note the newest, of each pass its own. */
final class PassReadings {
  private static final int OCTAVE = 12;

  private final List<Reading> all;

  PassReadings(List<Reading> all) {
    this.all = all;
  }

  /** The newest pass with anything read or moved; at least 1. */
  int lastPass(List<MadeMove> moves) {
    int read = all.stream().mapToInt(Reading::pass).max().orElse(1);
    int moved = moves.stream().mapToInt(m -> m.pass() + 1).max().orElse(1);
    return Math.max(read, moved);
  }

  /** What counts of one string in one pass; no frets while it has not been read. */
  NoteReadings of(int pass, int string) {
    SortedMap<Integer, Tries> frets = new TreeMap<>();
    Reading newest = null;
    Tries open = null;
    for (Reading reading : all) {
      if (reading.pass() != pass || reading.string() != string) {
        continue;
      }
      if (reading.fret() == 0) {
        open = reading.tries();
      } else {
        put(frets, reading.fret(), reading.tries());
        newest = deciding(newest, reading);
      }
    }
    Reference against = newest == null ? Reference.OPEN : newest.against();
    double sd = newest == null ? NoteReadings.USUAL_SD_CENTS : newest.sdCents();
    return new NoteReadings(frets, open, against, sd);
  }

  /** Whose terms hold for the string: fret 12's where it is read, else those of the newest note. */
  private static @Nullable Reading deciding(@Nullable Reading before, Reading reading) {
    boolean octaveHolds = before != null && before.fret() == OCTAVE && reading.fret() != OCTAVE;
    return reading.tries() == null || octaveHolds ? before : reading;
  }

  private static void put(SortedMap<Integer, Tries> frets, int fret, @Nullable Tries tries) {
    if (tries == null) {
      frets.remove(fret);
    } else {
      frets.put(fret, tries);
    }
  }

  /** Every fret that was read in any pass, in order. */
  List<Integer> fretsRead() {
    return all.stream()
        .map(Reading::fret)
        .filter(f -> f > 0)
        .distinct()
        .sorted(Comparator.naturalOrder())
        .toList();
  }
}
