package sillet.logbook.actions;

import java.time.LocalDate;
import java.util.UUID;

/**
 * Closes a visit.
 *
 * @param visitId the stay
 * @param day when it left
 */
public record HandOut(UUID visitId, LocalDate day) implements Action {

  @Override
  public String name() {
    return "hand out";
  }
}
