package sillet.logbook.moves;

/** A cause that a saddle cannot cure. */
public enum Finding {
  /** Tries disagree, one is wild, or a move did not act as it must: read again. */
  READING("reading", "finding.reading"),
  /** A false or worn string: no pattern, and the same frets are right on the others. */
  STRING("string", "finding.string"),
  /** The slot of this string lies higher than its neighbours'. */
  NUT_HIGH("nut-high", "finding.nut-high"),
  /** The nut stands too far from fret 1, on all strings. */
  NUT_FAR("nut-far", "finding.nut-far"),
  /** The nut stands too near to fret 1, on all strings. */
  NUT_NEAR("nut-near", "finding.nut-near"),
  /** One fret is misplaced, on all strings. */
  FRET("fret", "finding.fret"),
  /** Action above the shop's target explains the stretch. */
  ACTION("action", "finding.action");

  private final String word;
  private final String key;

  Finding(String word, String key) {
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
