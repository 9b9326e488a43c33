package sillet.logbook.actions;

import java.util.UUID;
import sillet.logbook.parts.PickupsMeasured;

/**
 * Writes down where the pickups of an instrument stand and how high; earlier measurings stay.
 *
 * @param instrumentId the instrument
 * @param measured the pickups
 */
public record RecordPickups(UUID instrumentId, PickupsMeasured measured) implements Action {

  @Override
  public String name() {
    return "record pickups";
  }
}
