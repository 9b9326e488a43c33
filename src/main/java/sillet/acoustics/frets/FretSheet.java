package sillet.acoustics.frets;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.pitch.FretPositions;

/**
 * Where the frets of a scale belong, as one would lay them out with a rule.
 *
 * @param scale nominal scale in m
 * @param lines fret 1 first
 */
public record FretSheet(double scale, List<Line> lines) {

  /** Copies the lines. */
  public FretSheet {
    lines = List.copyOf(lines);
  }

  /**
   * One fret.
   *
   * @param fret its number
   * @param fromNut distance from the uncompensated nut in m
   * @param fromBefore distance from the fret before, or from the nut, in m
   * @param toLast distance to the last fret of the board in m, 0 for the last itself
   */
  public record Line(int fret, double fromNut, double fromBefore, double toLast) {}

  /**
   * The sheet of a scale in twelve equal steps ({@link FretPositions}).
   *
   * @param scale nominal scale in m, finite and above zero
   * @param frets how many, 1 to {@link FretPositions#HIGHEST}
   * @throws IllegalArgumentException where a parameter is out of range
   */
  public static FretSheet of(double scale, int frets) {
    if (frets < 1) {
      throw new IllegalArgumentException("no frets: " + frets);
    }
    double last = FretPositions.fromNut(scale, frets);
    List<Line> lines = new ArrayList<>();
    for (int fret = 1; fret <= frets; fret++) {
      double place = FretPositions.fromNut(scale, fret);
      double before = FretPositions.fromNut(scale, fret - 1);
      lines.add(new Line(fret, place, place - before, last - place));
    }
    return new FretSheet(scale, lines);
  }
}
