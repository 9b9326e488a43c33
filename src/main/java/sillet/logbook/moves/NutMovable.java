package sillet.logbook.moves;

/** Whether the nut can move, and how. */
public enum NutMovable {
  /** The nut stays. */
  NO("no", "nut.no"),
  /** Every string's nut edge can be shaped or shimmed on its own. */
  EACH("each", "nut.each"),
  /** The nut moves as one. */
  WHOLE("whole", "nut.whole");

  private final String word;
  private final String key;

  NutMovable(String word, String key) {
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
