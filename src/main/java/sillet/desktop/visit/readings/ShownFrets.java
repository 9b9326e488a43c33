package sillet.desktop.visit.readings;

import java.util.List;
import java.util.TreeSet;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;

/**
 * The frets that have cells, lowest first.
 *
 * @param frets at least one, each once, 0 for the open string
 */
public record ShownFrets(List<Integer> frets) {
  /**
   * The octave, one fret in the middle and the one next to the nut (common practice, no source).
   */
  public static final ShownFrets USUAL = new ShownFrets(List.of(1, 5, 12));

  private static final int HIGHEST = 24;

  public ShownFrets {
    frets = List.copyOf(frets);
  }

  /**
   * Reads frets as typed, divided by spaces, commas or slashes.
   *
   * @throws Rejection if one is no fret of this neck or none is given
   */
  public static ShownFrets parse(String typed, int fretsOnNeck) {
    int highest = Math.min(HIGHEST, fretsOnNeck);
    TreeSet<Integer> frets = new TreeSet<>();
    for (String part : typed.strip().split("[\\s,;/]+", -1)) {
      if (!part.matches("\\d{1,2}") || Integer.parseInt(part) > highest) {
        throw Rejection.of("visit.frets.none", Quoted.of(part), Integer.toString(highest));
      }
      frets.add(Integer.valueOf(part));
    }
    return new ShownFrets(List.copyOf(frets));
  }

  /** The usual frets and every fret that was read. */
  public static ShownFrets including(Iterable<Integer> read) {
    TreeSet<Integer> frets = new TreeSet<>(USUAL.frets);
    for (Integer fret : read) {
      frets.add(fret);
    }
    return new ShownFrets(List.copyOf(frets));
  }

  /** As it is typed. */
  public String written() {
    return String.join(" ", frets.stream().map(fret -> Integer.toString(fret)).toList());
  }
}
