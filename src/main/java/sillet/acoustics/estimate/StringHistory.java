package sillet.acoustics.estimate;

import java.util.List;

/**
 * Everything known of one string place, oldest first.
 *
 * @param occasions at least one, in rising order of their pass; the last is now
 */
public record StringHistory(List<Occasion> occasions) {
  /**
   * Checks and copies.
   *
   * @throws IllegalArgumentException if there is no occasion or they are not in order
   */
  public StringHistory {
    occasions = List.copyOf(occasions);
    if (occasions.isEmpty()) {
      throw new IllegalArgumentException("a string without an occasion");
    }
    for (int i = 1; i < occasions.size(); i++) {
      if (occasions.get(i).pass() <= occasions.get(i - 1).pass()) {
        throw new IllegalArgumentException("occasions are not in the order of their passes");
      }
    }
  }

  /** A string read once. */
  public static StringHistory of(Occasion only) {
    return new StringHistory(List.of(only));
  }

  /** The last occasion. */
  public Occasion now() {
    return occasions.get(occasions.size() - 1);
  }
}
