package sillet.logbook.visits;

/** How a check was made; figures of different methods are not compared. */
public enum CheckMethod {
  /** Straightedge on the frets. */
  STRAIGHTEDGE("straightedge", "method.straightedge"),
  /** The string itself pressed down as a straightedge. */
  STRING("string", "method.string"),
  /** Open string. */
  OPEN("open", "method.open"),
  /** With a capo on fret 1. */
  CAPO_1("capo-1", "method.capo-1"),
  /** String pressed at fret 3. */
  PRESSED_3("pressed-3", "method.pressed-3"),
  /** String pressed at the last fret. */
  PRESSED_LAST("pressed-last", "method.pressed-last");

  private final String word;
  private final String key;

  CheckMethod(String word, String key) {
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
