package sillet.logbook.moves;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/**
 * A saddle or bridge in one piece: the straight line that serves all strings best, and what it
 * leaves.
 *
 * @param trebleMm move of its end under string 1, positive away from the neck
 * @param bassMm move of its end under the last string, positive away from the neck
 * @param left what stays on each string with that line, string 1 first
 * @param notes sentences for people
 */
public record BridgeAdvice(
    double trebleMm, double bassMm, List<StringLeft> left, List<Message> notes) {

  /** Copies the lists. */
  public BridgeAdvice {
    left = List.copyOf(left);
    notes = List.copyOf(notes);
  }

  /**
   * One string on the line.
   *
   * @param string number
   * @param cents12 what stays at fret 12
   * @param rms what stays over frets 1 to 12, root mean square, cents
   * @param fromFrontMm where this string's own best break point lies, from the front edge of the
   *     saddle; null where the room in front of it is not known
   * @param fits whether that point lies on the saddle with a margin at each edge; null where that
   *     is not known
   */
  public record StringLeft(
      int string,
      double cents12,
      double rms,
      @Nullable Double fromFrontMm,
      @Nullable Boolean fits) {}
}
