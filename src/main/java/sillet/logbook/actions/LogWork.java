package sillet.logbook.actions;

import java.util.UUID;
import sillet.logbook.visits.WorkLine;

/**
 * Writes down something done.
 *
 * @param visitId the stay
 * @param line what was done
 */
public record LogWork(UUID visitId, WorkLine line) implements Action {

  @Override
  public String name() {
    return "log work";
  }
}
