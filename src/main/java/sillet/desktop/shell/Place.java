package sillet.desktop.shell;

import java.util.UUID;
import org.jspecify.annotations.Nullable;

/** Somewhere one can be in the window once a logbook is open. */
sealed interface Place {
  /** The open visits. */
  record Bench() implements Place {}

  /** The search over instruments. */
  record Instruments() implements Place {}

  /** The drawer of string sets. */
  record Sets() implements Place {}

  /** The shop itself, and the ways to other logbooks. */
  record ShopPlace() implements Place {}

  /** Taking in; without an instrument it is chosen or made there. */
  record TakeIn(@Nullable UUID instrumentId) implements Place {}

  /** One visit. */
  record AtVisit(int ticket) implements Place {}

  /** What a change would ask of the instrument of a visit. */
  record Forecast(int ticket) implements Place {}

  /** One instrument and its visits. */
  record History(UUID instrumentId) implements Place {}

  /** The fret sheet of an instrument. */
  record Frets(UUID instrumentId) implements Place {}

  /** The pickup sheet of an instrument. */
  record Pickups(UUID instrumentId) implements Place {}

  /** Under which word of the top line a place stands. */
  enum Word {
    BENCH,
    INSTRUMENTS,
    SETS,
    SHOP
  }

  default Word word() {
    if (this instanceof ShopPlace) {
      return Word.SHOP;
    }
    if (this instanceof Sets) {
      return Word.SETS;
    }
    boolean parts = this instanceof Frets || this instanceof Pickups;
    boolean instruments = parts || this instanceof Instruments || this instanceof History;
    return instruments ? Word.INSTRUMENTS : Word.BENCH;
  }
}
