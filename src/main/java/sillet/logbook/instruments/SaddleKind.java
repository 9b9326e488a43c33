package sillet.logbook.instruments;

/** How the speaking length ends at the bridge, which decides what a move means for the hand. */
public enum SaddleKind {
  /** One saddle a string, moved by a screw. */
  SCREW("screw", "saddle.screw"),
  /** One saddle a string, slid and clamped by hand. */
  SLIDING("sliding", "saddle.sliding"),
  /** One fixed saddle for all strings; break points are filed, a one-way cut. */
  ONE_PIECE("one-piece", "saddle.one-piece"),
  /** A bridge held by the strings alone and moved as a whole. */
  FLOATING("floating", "saddle.floating");

  private final String word;
  private final String key;

  SaddleKind(String word, String key) {
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
