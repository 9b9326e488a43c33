package sillet.logbook.moves;

import java.util.List;

/**
 * One string of an instrument with everything that was ever read of it.
 *
 * @param occasions at least one, the oldest first; the last is now
 */
public record BenchHistory(List<BenchOccasion> occasions) {

  /** Copies the list. */
  public BenchHistory {
    occasions = List.copyOf(occasions);
    if (occasions.isEmpty()) {
      throw new IllegalArgumentException("a history begins with an occasion");
    }
  }

  /**
   * A string that is read for the first time.
   *
   * @param string as it lies and is read
   * @return its history
   */
  public static BenchHistory of(BenchString string) {
    return new BenchHistory(List.of(BenchOccasion.only(string)));
  }

  /**
   * The string as it is now.
   *
   * @return the newest occasion's string
   */
  public BenchString now() {
    return occasions.get(occasions.size() - 1).string();
  }
}
