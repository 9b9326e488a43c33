package sillet.desktop.visit.readings;

import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.TrySpread;
import sillet.logbook.text.Message;

/**
 * What a cell shows.
 *
 * @param text the median, or what was typed where it cannot be read
 * @param typing the same while one types: all tries
 * @param state how it is drawn
 * @param tries how many
 * @param wildTry index of the odd one
 * @param problem why it cannot be taken; null if it can
 */
public record CellFace(
    String text,
    String typing,
    State state,
    int tries,
    OptionalInt wildTry,
    @Nullable Message problem) {

  /** How a cell is drawn. */
  public enum State {
    UNREAD,
    READ,
    ERROR
  }

  static CellFace of(CellText entry, double sdCents) {
    if (entry.problem() != null) {
      return new CellFace(
          entry.typed(), entry.typed(), State.ERROR, 0, OptionalInt.empty(), entry.problem());
    }
    var tries = entry.tries();
    if (tries == null) {
      return new CellFace("", entry.typed(), State.UNREAD, 0, OptionalInt.empty(), null);
    }
    TrySpread spread = TrySpread.of(tries.values(), sdCents);
    String median = CentsText.of(spread.median());
    int count = tries.cents().size();
    return new CellFace(median, entry.typed(), State.READ, count, spread.wildTry(), null);
  }
}
