package sillet.logbook.moves;

/** Which way a saddle goes. */
public enum Direction {
  /** Longer string, flatter fretted notes. */
  AWAY("away from neck", "direction.away"),
  /** Shorter string, sharper fretted notes. */
  TOWARD("toward neck", "direction.toward"),
  /** No move. */
  STAY("stay", "direction.stay");

  private final String word;
  private final String key;

  Direction(String word, String key) {
    this.word = word;
    this.key = key;
  }

  /**
   * The word it is stored under.
   *
   * @return stable word
   */
  public String word() {
    return word;
  }

  /**
   * The text key of its name.
   *
   * @return key of the text bundle
   */
  public String key() {
    return key;
  }
}
