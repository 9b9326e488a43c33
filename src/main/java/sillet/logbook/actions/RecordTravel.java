package sillet.logbook.actions;

import java.util.List;
import java.util.UUID;
import sillet.logbook.visits.Travel;

/**
 * Writes down the room at saddles as the instrument came in; what was written of the same saddle
 * before is replaced.
 *
 * @param visitId the stay
 * @param travel at least one saddle
 */
public record RecordTravel(UUID visitId, List<Travel> travel) implements Action {

  /** Copies the list. */
  public RecordTravel {
    travel = List.copyOf(travel);
  }

  @Override
  public String name() {
    return "record travel";
  }
}
