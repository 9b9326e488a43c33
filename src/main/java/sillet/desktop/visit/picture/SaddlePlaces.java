package sillet.desktop.visit.picture;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.visits.StringPass;

/**
 * Where the saddle of a string stood in each pass. The first pass that was read tells the place;
 * from there on, and back, the moves that were made count, so that one saddle is not drawn at two
 * places because two readings scatter.
 */
final class SaddlePlaces {
  private SaddlePlaces() {}

  /**
   * The place in a pass, from the nominal scale line.
   *
   * @param passes every pass, in each the strings in order
   * @param row which string, from 0
   * @param pass from 1
   * @return millimetres; null while no pass was read
   */
  static @Nullable Double mm(List<List<StringPass>> passes, int row, int pass) {
    for (int read = 1; read <= passes.size(); read++) {
      MoveFigures figures = figures(passes.get(read - 1).get(row));
      if (figures != null) {
        return figures.setbackMm() + moved(passes, row, read, pass);
      }
    }
    return null;
  }

  /** How far it went between two passes. */
  private static double moved(List<List<StringPass>> passes, int row, int from, int to) {
    double mm = 0;
    for (int pass = Math.min(from, to); pass < Math.max(from, to); pass++) {
      Double made = passes.get(pass - 1).get(row).madeMm();
      mm += made == null ? 0 : made;
    }
    return from <= to ? mm : -mm;
  }

  static @Nullable MoveFigures figures(StringPass string) {
    MoveAdvice advice = string.advice();
    return advice == null ? null : advice.figures();
  }
}
