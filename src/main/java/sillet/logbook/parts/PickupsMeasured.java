package sillet.logbook.parts;

import java.time.Instant;
import java.util.List;

/**
 * The pickups of an instrument as they were measured at one time; a row of the height log.
 *
 * @param at when
 * @param pickups the one nearest to the bridge first, at least one
 */
public record PickupsMeasured(Instant at, List<Pickup> pickups) {

  /** Copies the pickups. */
  public PickupsMeasured {
    pickups = List.copyOf(pickups);
  }
}
