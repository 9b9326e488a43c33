package sillet.logbook.instruments;

/** What kind of instrument it is; the word is stored, the key is shown. */
public enum InstrumentKind {
  /** Solid or semi-hollow electric guitar. */
  ELECTRIC("electric", "kind.electric"),
  /** Steel-string flat-top guitar. */
  STEEL_STRING("steel-string", "kind.steel-string"),
  /** Nylon-string guitar. */
  NYLON_STRING("nylon-string", "kind.nylon-string"),
  /** Archtop guitar. */
  ARCHTOP("archtop", "kind.archtop"),
  /** Electric bass. */
  BASS("bass", "kind.bass"),
  /** Mandolin family. */
  MANDOLIN("mandolin", "kind.mandolin"),
  /** Banjo family. */
  BANJO("banjo", "kind.banjo"),
  /** Ukulele family. */
  UKULELE("ukulele", "kind.ukulele"),
  /** Anything else with frets. */
  OTHER("other", "kind.other");

  private final String word;
  private final String key;

  InstrumentKind(String word, String key) {
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
