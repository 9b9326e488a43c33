package sillet.logbook.instruments;

/**
 * What a clockwise turn of the saddle screw does; while it is not known no screen says clockwise.
 */
public enum ScrewSense {
  /** Not tried yet. */
  NOT_KNOWN("not-known", "sense.not-known"),
  /** Clockwise moves the saddle away from the neck. */
  CLOCKWISE_AWAY("clockwise-away", "sense.clockwise-away"),
  /** Clockwise moves the saddle toward the neck. */
  CLOCKWISE_TOWARD("clockwise-toward", "sense.clockwise-toward");

  private final String word;
  private final String key;

  ScrewSense(String word, String key) {
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
