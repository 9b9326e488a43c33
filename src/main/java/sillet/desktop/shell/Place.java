package sillet.desktop.shell;

import java.util.UUID;
import org.jspecify.annotations.Nullable;

/** Somewhere one can be in the window once a logbook is open. */
sealed interface Place {
  /** The open visits. */
  record Bench() implements Place {}

  /** The search over instruments. */
  record Instruments() implements Place {}

  /** Taking in; without an instrument it is chosen or made there. */
  record TakeIn(@Nullable UUID instrumentId) implements Place {}

  /** One visit. */
  record AtVisit(int ticket) implements Place {}

  /** One instrument and its visits. */
  record History(UUID instrumentId) implements Place {}

  /** Whether the word "Bench" in the top line stands for this place. */
  default boolean underBench() {
    return this instanceof Bench || this instanceof AtVisit || this instanceof TakeIn;
  }
}
