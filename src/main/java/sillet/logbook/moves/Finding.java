package sillet.logbook.moves;

/** A cause that a saddle cannot cure. */
public enum Finding {
  /** Tries disagree, one is wild, or a move did not act as it must: read again. */
  READING("reading", "finding.reading");

  private final String word;
  private final String key;

  Finding(String word, String key) {
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
