package sillet.logbook.moves;

/** What to do with the figures. */
public enum Verdict {
  /** Make the move. */
  MOVE("move", "verdict.move"),
  /** Leave it: less than the readings can tell. */
  LEAVE("leave", "verdict.leave"),
  /** The move does not fit into the travel. */
  NO_ROOM("no-room", "verdict.no-room"),
  /** The move passes the edge of a one-piece saddle: slot work. */
  SLOT("slot", "verdict.slot");

  private final String word;
  private final String key;

  Verdict(String word, String key) {
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
