package sillet.logbook.actions;

import sillet.logbook.visits.Visit;

/**
 * Opens a visit.
 *
 * @param visit the stay, with strings and travel
 */
public record TakeIn(Visit visit) implements Action {

  @Override
  public String name() {
    return "take in";
  }
}
