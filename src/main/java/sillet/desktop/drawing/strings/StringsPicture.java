package sillet.desktop.drawing.strings;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

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
 * @param nuts nut edges that shall move
 */
public record StringsPicture(
    List<StringRow> rows,
    Board board,
    Bridge bridge,
    Lie lie,
    List<FindingMark> findings,
    OptionalDouble spreadMm,
    List<NutMark> nuts) {
  /** The most strings that are drawn. */
  public static final int MOST_STRINGS = 24;

  /**
   * The fretted board.
   *
   * @param frets number of the last fret
   * @param readFrets frets with a column of cells, in order, counted along the neck
   * @param straightFret the fret at a right angle to the neck, where strings differ in scale
   * @param column where read frets stand too close for cells beside them: the one fret whose cells
   *     are open, in a column behind the board; null where each fret has its own
   */
  public record Board(
      int frets, List<Integer> readFrets, int straightFret, @Nullable Column column) {
    public Board {
      if (frets < 1 || frets > 36) {
        throw new IllegalArgumentException("A board has 1 to 36 frets: " + frets);
      }
      readFrets = readFrets.stream().distinct().sorted().toList();
    }

    /** A board on which every read fret has cells of its own. */
    public Board(int frets, List<Integer> readFrets, int straightFret) {
      this(frets, readFrets, straightFret, null);
    }

    /** A board for strings of one scale. */
    public static Board of(int frets, List<Integer> readFrets) {
      return new Board(frets, readFrets, 0);
    }

    /** The same with the cells of one fret in a column. */
    public Board with(Column open) {
      return new Board(frets, readFrets, straightFret, open);
    }
  }

  /**
   * The open cells behind the board.
   *
   * @param fret counted from each string's own nut
   * @param head stands above them
   */
  public record Column(int fret, String head) {}

  /** A picture on which the nut stays. */
  public StringsPicture(
      List<StringRow> rows,
      Board board,
      Bridge bridge,
      Lie lie,
      List<FindingMark> findings,
      OptionalDouble spreadMm) {
    this(rows, board, bridge, lie, findings, spreadMm, List.of());
  }

  public StringsPicture {
    if (rows.isEmpty() || rows.size() > MOST_STRINGS) {
      throw new IllegalArgumentException("Cannot draw so many strings: " + rows.size());
    }
    rows = List.copyOf(rows);
    findings = List.copyOf(findings);
    nuts = List.copyOf(nuts);
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
