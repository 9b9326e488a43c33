package sillet.logbook.forecast;

/** How a string feels under the hand against another tension. */
public enum StringFeel {
  /** More than 5 % less tension. */
  LIGHTER("lighter", "feel.lighter"),
  /** Within 5 %. */
  SAME("same", "feel.same"),
  /** More than 5 % more tension. */
  HEAVIER("heavier", "feel.heavier");

  private final String word;
  private final String key;

  StringFeel(String word, String key) {
    this.word = word;
    this.key = key;
  }

  /**
   * The word of the files.
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
