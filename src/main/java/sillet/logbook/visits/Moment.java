package sillet.logbook.visits;

/** When a check was made. */
public enum Moment {
  /** As the instrument came in. */
  RECEIVED("received", "moment.received"),
  /** As it is handed out. */
  LEFT("left", "moment.left");

  private final String word;
  private final String key;

  Moment(String word, String key) {
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
