package sillet.logbook.actions;

import java.util.UUID;
import sillet.logbook.parts.FretPlaces;

/**
 * Writes down where the frets of an instrument were measured; earlier measurings stay.
 *
 * @param instrumentId the instrument
 * @param measured the places
 */
public record RecordFretPlaces(UUID instrumentId, FretPlaces measured) implements Action {

  @Override
  public String name() {
    return "record fret places";
  }
}
