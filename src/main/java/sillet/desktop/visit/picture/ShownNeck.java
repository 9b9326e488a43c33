package sillet.desktop.visit.picture;

import java.util.List;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/**
 * Which notes of a string are drawn.
 *
 * @param cells frets one reads, counted from each string's own nut, in order
 * @param open the fret whose cells are open while the whole neck is drawn; null where only the
 *     frets with cells are drawn
 * @param head stands above those cells; empty with them
 */
public record ShownNeck(List<Integer> cells, @Nullable Integer open, String head) {
  private static final int OCTAVE = 12;

  public ShownNeck {
    cells = List.copyOf(cells);
  }

  /** Only the frets with cells. */
  public static ShownNeck cells(List<Integer> frets) {
    return new ShownNeck(frets, null, "");
  }

  /** Every fret that has a mark: those with cells, and up to the octave on the whole neck. */
  List<Integer> marked(int lastFret) {
    TreeSet<Integer> all = new TreeSet<>(cells);
    for (int fret = 1; open != null && fret <= Math.min(OCTAVE, lastFret); fret++) {
      all.add(fret);
    }
    return List.copyOf(all);
  }
}
