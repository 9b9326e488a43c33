package sillet.desktop.visit.readings;

import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;

/**
 * Where the hand goes next. Enter keeps the fret and goes down the strings; after the last string
 * it goes to the first string at the next shown fret, and stays after the last of all. Tab keeps
 * the string and goes up the frets, then on to the next string, and leaves the grid after the last
 * cell.
 *
 * @param strings how many
 * @param frets the shown frets, lowest first
 */
public record GridWalk(int strings, List<Integer> frets) {
  /** Where most technicians read first. */
  private static final int OCTAVE_FRET = 12;

  public GridWalk {
    frets = List.copyOf(frets);
  }

  /** The cell Enter goes to; the same one at the very end. */
  public Cell nextString(Cell from) {
    if (from.string() < strings) {
      return new Cell(from.string() + 1, from.fret());
    }
    int next = frets.indexOf(from.fret()) + 1;
    return next < frets.size() ? new Cell(1, frets.get(next)) : from;
  }

  /** The cell Enter with Shift goes to; the same one at the very start. */
  public Cell previousString(Cell from) {
    if (from.string() > 1) {
      return new Cell(from.string() - 1, from.fret());
    }
    int previous = frets.indexOf(from.fret()) - 1;
    return previous >= 0 ? new Cell(strings, frets.get(previous)) : from;
  }

  /** The cell Tab goes to; empty where Tab leaves the grid. */
  public Optional<Cell> nextFret(Cell from) {
    int next = frets.indexOf(from.fret()) + 1;
    if (next < frets.size()) {
      return Optional.of(new Cell(from.string(), frets.get(next)));
    }
    return from.string() < strings
        ? Optional.of(new Cell(from.string() + 1, frets.get(0)))
        : Optional.empty();
  }

  /** The cell Tab with Shift goes to; empty where it leaves the grid. */
  public Optional<Cell> previousFret(Cell from) {
    int previous = frets.indexOf(from.fret()) - 1;
    if (previous >= 0) {
      return Optional.of(new Cell(from.string(), frets.get(previous)));
    }
    return from.string() > 1
        ? Optional.of(new Cell(from.string() - 1, frets.get(frets.size() - 1)))
        : Optional.empty();
  }

  /** Where to begin: the first string not yet read at fret 12, or at the last shown fret. */
  public Cell start(Predicate<Cell> read) {
    int fret = frets.contains(OCTAVE_FRET) ? OCTAVE_FRET : frets.get(frets.size() - 1);
    for (int string = 1; string <= strings; string++) {
      Cell cell = new Cell(string, fret);
      if (!read.test(cell)) {
        return cell;
      }
    }
    return new Cell(1, fret);
  }
}
