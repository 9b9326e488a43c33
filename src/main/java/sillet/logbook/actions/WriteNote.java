package sillet.logbook.actions;

import java.util.UUID;
import sillet.logbook.visits.VisitNote;

/**
 * Writes a note.
 *
 * @param visitId the stay
 * @param note the words
 */
public record WriteNote(UUID visitId, VisitNote note) implements Action {

  @Override
  public String name() {
    return "write note";
  }
}
