package sillet.logbook.moves;

import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;
import sillet.logbook.units.Tries;

/**
 * What the tuner said of one string.
 *
 * @param frets tries by fret, 1 to 24
 * @param open what the open string itself read at that time; null means it was tuned, 0
 * @param against what the notes were compared with
 * @param sdCents standard deviation of one reading of the difference, the tuner's resolution
 *     included
 */
public record NoteReadings(
    SortedMap<Integer, Tries> frets, @Nullable Tries open, Reference against, double sdCents) {
  /** Standard deviation of one reading where nothing else is said, cents. */
  public static final double USUAL_SD_CENTS = 0.5;

  private static final int LAST_FRET_BESIDE_NUT = 5;

  /** Copies the map. */
  public NoteReadings {
    frets = java.util.Collections.unmodifiableSortedMap(new TreeMap<>(frets));
  }

  /**
   * The tries at a fret taken together.
   *
   * @param fret 1 to 24
   * @return what was read, or null if nothing was
   */
  public @Nullable NoteRead at(int fret) {
    Tries tries = frets.get(fret);
    return tries == null ? null : BenchEvidence.read(tries, this);
  }

  /**
   * Whether enough was read beside the nut to say where its edge should be: two of frets 1 to 5.
   *
   * @return false where a nut figure is a guess from the model
   */
  public boolean knowTheNut() {
    return frets.headMap(LAST_FRET_BESIDE_NUT + 1).size() >= 2;
  }

  /**
   * Readings against the open string with the usual scatter.
   *
   * @param frets tries by fret
   * @return the readings
   */
  public static NoteReadings of(Map<Integer, Tries> frets) {
    return new NoteReadings(new TreeMap<>(frets), null, Reference.OPEN, USUAL_SD_CENTS);
  }
}
