package sillet.logbook.actions;

import java.util.List;
import java.util.UUID;
import sillet.logbook.visits.Reading;

/**
 * Adds readings; nothing read before is changed.
 *
 * @param visitId the stay
 * @param readings at least one
 */
public record RecordReadings(UUID visitId, List<Reading> readings) implements Action {

  /** Copies the list. */
  public RecordReadings {
    readings = List.copyOf(readings);
  }

  @Override
  public String name() {
    return "record readings";
  }
}
