package sillet.desktop.visit.words;

import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Eighths;
import sillet.logbook.moves.Direction;

/**
 * The words beside one string.
 *
 * @param string number
 * @param kind what they are about, which is also the mark before them
 * @param direction of the move; stay where there is none
 * @param turns the figure to act on; null where millimetres are, or there is nothing to do
 * @param head bold, in the first line
 * @param mm the move without sign and unit; empty where there is none
 * @param range its 95 % interval; empty where there is none
 * @param nut what the nut shall do beside it; empty where it stays
 * @param left travel left after the move, without unit; empty if not known
 * @param sentence in the second line, in place of interval and travel; empty where they stand
 */
public record StringWords(
    int string,
    Kind kind,
    Direction direction,
    @Nullable Eighths turns,
    String head,
    String mm,
    String range,
    String nut,
    String left,
    String sentence) {

  /** What the words are about. */
  public enum Kind {
    NOT_READ(false),
    MOVE(true),
    LEAVE(false),
    NO_ROOM(true),
    SLOT(true),
    WITHIN(false),
    MADE(false),
    NOT_SOLVED(true);

    private final boolean needsHand;

    Kind(boolean needsHand) {
      this.needsHand = needsHand;
    }

    /** True if the string still needs a hand: drawn in pencil. */
    public boolean needsHand() {
      return needsHand;
    }

    /** True if there is a way to go and a size. */
    public boolean moves() {
      return this == MOVE || this == NO_ROOM || this == SLOT;
    }
  }
}
