package sillet.logbook.visits;

/** What is measured beside the readings. */
public enum CheckKind {
  /** Forward bow of the neck. */
  RELIEF("relief", "check.relief"),
  /** Gap from string to fret top. */
  ACTION("action", "check.action"),
  /** Gap over fret 1. */
  FIRST_FRET_CLEARANCE("first-fret-clearance", "check.first-fret-clearance"),
  /** Gap from string to pickup with the last fret pressed. */
  PICKUP_HEIGHT("pickup-height", "check.pickup-height"),
  /** Saddle above the top. */
  SADDLE_HEIGHT("saddle-height", "check.saddle-height");

  private final String word;
  private final String key;

  CheckKind(String word, String key) {
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
