package sillet.logbook.moves;

import java.util.List;

/**
 * One string of an instrument with everything that was ever read of it.
 *
 * @param occasions at least one, the oldest first; the last is now
 */
public record BenchHistory(List<BenchOccasion> occasions) {
  /** Fewer frets cannot tell a saddle from a nut. */
  private static final int ALONG_THE_NECK = 3;

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

  /**
   * What still speaks of how the string lies: slots are cut and heights set between readings, so
   * that everything from before the last reading along the neck, or from before its last move that
   * is not known, is left out.
   *
   * @return the newest occasions, at least the last
   */
  public BenchHistory ofNow() {
    int first = occasions.size() - 1;
    while (first > 0
        && occasions.get(first).saddleMovedMm() != null
        && occasions.get(first).string().readings().frets().size() < ALONG_THE_NECK) {
      first--;
    }
    return new BenchHistory(occasions.subList(first, occasions.size()));
  }
}
