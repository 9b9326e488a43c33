package sillet.desktop.drawing.strings;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;

/**
 * Everything the strings drawing shows.
 *
 * @param rows the strings, 1 first; 4 to 12 are usual, 1 to 24 are drawn
 * @param board the frets
 * @param bridge what stands at the other end
 * @param lie how it lies before the technician
 * @param findings those not dealt with yet
 * @param spreadMm string 1 to the last string at the bridge, for the scale across; empty where not
 *     known
 */
public record StringsPicture(
    List<StringRow> rows,
    Board board,
    Bridge bridge,
    Lie lie,
    List<FindingMark> findings,
    OptionalDouble spreadMm) {
  /** The most strings that are drawn. */
  public static final int MOST_STRINGS = 24;

  /**
   * The fretted board.
   *
   * @param frets number of the last fret
   * @param readFrets frets with a column of cells, in order, counted along the neck
   * @param straightFret the fret at a right angle to the neck, where strings differ in scale
   */
  public record Board(int frets, List<Integer> readFrets, int straightFret) {
    public Board {
      if (frets < 1 || frets > 36) {
        throw new IllegalArgumentException("A board has 1 to 36 frets: " + frets);
      }
      readFrets = readFrets.stream().distinct().sorted().toList();
    }

    /** A board for strings of one scale. */
    public static Board of(int frets, List<Integer> readFrets) {
      return new Board(frets, readFrets, 0);
    }
  }

  public StringsPicture {
    if (rows.isEmpty() || rows.size() > MOST_STRINGS) {
      throw new IllegalArgumentException("Cannot draw so many strings: " + rows.size());
    }
    rows = List.copyOf(rows);
    findings = List.copyOf(findings);
  }

  /** Strings that share a course with a neighbour lie in pairs. */
  public boolean hasCourses() {
    return IntStream.range(1, rows.size()).anyMatch(this::closeToTheOneBefore);
  }

  boolean closeToTheOneBefore(int row) {
    int course = rows.get(row).course();
    return row > 0 && course > 0 && course == rows.get(row - 1).course();
  }

  boolean isOnePiece() {
    return bridge instanceof Bridge.OnePiece;
  }
}
