package sillet.logbook.visits;

/** What a note is for. */
public enum NoteKind {
  /** For the bench. */
  NOTE("note", "note.note"),
  /** Advice given to the customer. */
  ADVICE("advice", "note.advice"),
  /** Offered and declined, in the customer's words. */
  DECLINED("declined", "note.declined");

  private final String word;
  private final String key;

  NoteKind(String word, String key) {
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
