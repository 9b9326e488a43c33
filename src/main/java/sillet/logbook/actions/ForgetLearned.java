package sillet.logbook.actions;

import java.time.Instant;
import java.util.UUID;

/**
 * Lets go of what the readings of an instrument have taught, as after a new fretboard or bridge.
 * The readings themselves stay.
 *
 * @param instrumentId the instrument
 * @param from readings before this moment teach nothing from now on
 */
public record ForgetLearned(UUID instrumentId, Instant from) implements Action {

  @Override
  public String name() {
    return "forget learned";
  }
}
