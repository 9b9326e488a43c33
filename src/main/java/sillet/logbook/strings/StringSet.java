package sillet.logbook.strings;

import java.util.List;
import java.util.UUID;

/**
 * A set of strings as it lies in the drawer.
 *
 * @param id identity
 * @param name the shop's name for it
 * @param strings makes in order, string 1 first
 */
public record StringSet(UUID id, String name, List<StringMake> strings) {

  /** Copies the strings. */
  public StringSet {
    strings = List.copyOf(strings);
  }
}
