package sillet.logbook.actions;

import sillet.logbook.strings.StringSet;

/**
 * Puts a string set into the drawer, or replaces the one with the same identity.
 *
 * @param set the set, whole
 */
public record KeepStringSet(StringSet set) implements Action {

  @Override
  public String name() {
    return "keep string set";
  }
}
