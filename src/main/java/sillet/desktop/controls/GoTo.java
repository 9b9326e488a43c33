package sillet.desktop.controls;

import java.util.UUID;
import org.jspecify.annotations.Nullable;

/** The places of the window, as a screen may ask for them. Call on the window's thread. */
public interface GoTo {
  /** The open visits, by promised date. */
  void bench();

  /** The search over all instruments. */
  void instruments();

  /** One instrument's head and its visits; the same place as {@link #history}. */
  default void instrument(UUID instrumentId) {
    history(instrumentId);
  }

  /** Takes in a visit; with null the instrument is chosen or made there first. */
  void takeIn(@Nullable UUID instrumentId);

  /** The visit of a ticket. */
  void visit(int ticket);

  /** What other strings, tuning or action would ask of the instrument of a ticket. */
  void forecast(int ticket);

  /** What was read and done on an instrument, visit by visit. */
  void history(UUID instrumentId);

  /** Where the frets of an instrument belong and where they stand. */
  void frets(UUID instrumentId);

  /** The pickups of an instrument. */
  void pickups(UUID instrumentId);

  /** The first start: leaves the logbook that is open. */
  void start();

  /** The place before this one; the bench where there is none. */
  void back();
}
