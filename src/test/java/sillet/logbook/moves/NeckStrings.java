package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;

/**
 * An invented six-string read along its neck, 648 mm, with and without faults. The readings are
 * those of a reckoned instrument with 0.3 cents of noise; its faults are named at each set.
 */
public final class NeckStrings {
  /** Where the strings are read. */
  public static final List<Integer> FRETS = List.of(1, 2, 3, 5, 7, 9, 12, 15, 17);

  /** Nothing wrong with it. */
  public static final List<String> CLEAN =
      List.of(
          "1.7, 1.5, 1.7, 2.7, 3.2, 3.6, 5.4, 7.3, 8.3",
          "1.5, 1.4, 1.4, 2.2, 2.3, 2.3, 3.2, 3.1, 3.7",
          "3.9, 2.9, 3.9, 4.5, 4.7, 6.6, 6.7, 8.5, 11.0",
          "2.0, 2.1, 2.1, 1.4, 1.8, 0.8, 0.2, -0.9, -0.1",
          "2.4, 2.0, 1.8, 2.4, 2.2, 2.2, 2.2, 2.0, 2.0",
          "3.9, 2.6, 1.9, 1.4, 0.9, 0.0, -2.5, -5.8, -6.8");

  /** The same with its saddles moved by 2.0, 1.5, 3.0, 0.4, 1.2 and -0.2 mm away from the neck. */
  public static final List<String> MOVED =
      List.of(
          "1.5, 0.8, 0.6, 0.9, 0.2, 0.7, -0.2, -0.2, -1.5",
          "1.7, 1.2, 1.0, 0.3, 0.4, -0.3, -0.8, -2.5, -2.9",
          "3.4, 2.0, 1.9, 1.0, 0.7, 0.5, -1.2, -2.1, -2.9",
          "2.3, 1.3, 1.2, 0.4, 1.1, 0.4, -0.7, -2.1, -2.0",
          "2.2, 1.8, 2.0, 1.0, 0.6, 1.0, -1.2, -3.2, -3.4",
          "4.0, 2.5, 1.7, 2.0, 0.9, 0.7, -2.1, -4.3, -6.1");

  /** The slot of string 4 is 0.40 mm high, fret 7 stands 0.45 mm toward the bridge. */
  public static final List<String> SLOT_AND_FRET =
      List.of(
          "1.3, 1.9, 1.6, 3.2, 4.2, 3.8, 4.7, 6.3, 7.7",
          "2.5, 1.9, 0.7, 1.7, 4.9, 2.9, 3.1, 3.7, 3.4",
          "3.5, 3.0, 3.4, 4.5, 6.5, 6.4, 6.7, 9.2, 11.0",
          "7.1, 4.2, 2.9, 2.2, 3.8, 0.5, -0.1, 0.0, -0.9",
          "2.8, 2.8, 2.2, 2.1, 4.2, 2.4, 1.6, 2.1, 1.4",
          "3.9, 2.9, 2.2, 1.5, 2.6, -0.3, -2.5, -4.7, -6.9");

  /** The nut stands 1.0 mm too far from fret 1. */
  public static final List<String> NUT_FAR =
      List.of(
          "3.8, 4.2, 3.7, 5.0, 3.7, 4.7, 4.7, 5.3, 5.9",
          "4.9, 4.2, 2.9, 3.5, 4.4, 3.7, 3.1, 2.7, 1.6",
          "5.9, 5.3, 5.5, 6.2, 6.0, 7.3, 6.7, 8.2, 9.2",
          "4.9, 4.2, 3.4, 2.9, 2.7, 1.0, -0.1, -0.7, -2.1",
          "5.2, 5.1, 4.3, 3.8, 3.8, 3.2, 1.6, 1.1, -0.3",
          "6.3, 5.2, 4.3, 3.2, 2.1, 0.5, -2.5, -5.7, -8.6");

  private static final String[] PITCHES = {"E4", "B3", "G3", "D3", "A2", "E2"};
  private static final double[] GAUGES_IN = {.010, .013, .017, .026, .036, .046};
  private static final double SD_CENTS = 0.3;

  private NeckStrings() {}

  /** The strings with the readings of each row, the gaps over fret 1 not measured. */
  public static List<BenchString> read(List<String> rows, SaddleRoom room) {
    List<BenchString> strings = new ArrayList<>();
    for (int i = 0; i < rows.size(); i++) {
      Heights heights = new Heights(1.6 + 0.1 * i, null, 0.2);
      strings.add(new BenchString("test", fitted(i), heights, room, readings(rows.get(i))));
    }
    return strings;
  }

  /** One of the strings on the instrument, from 0. */
  public static FittedString fitted(int index) {
    Construction construction = index < 3 ? Construction.PLAIN_STEEL : Construction.WOUND_STEEL;
    return new FittedString(
        index + 1,
        Pitch.parse(PITCHES[index], 440),
        648,
        StringMake.of(GAUGES_IN[index], construction));
  }

  /** Cents at {@link #FRETS} in a row with commas. */
  public static NoteReadings readings(String row) {
    TreeMap<Integer, Tries> frets = new TreeMap<>();
    String[] cents = row.split(",", -1);
    for (int i = 0; i < cents.length; i++) {
      if (!cents[i].isBlank()) {
        frets.put(FRETS.get(i), Tries.parse(cents[i].strip()));
      }
    }
    return new NoteReadings(frets, null, Reference.OPEN, SD_CENTS);
  }
}
