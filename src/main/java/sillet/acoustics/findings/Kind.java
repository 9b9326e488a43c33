package sillet.acoustics.findings;

/** What a finding names as the cause, in the order to look: cheap and reversible before one-way. */
public enum Kind {
  /** The tries of a note disagree, or one reading is wild: read again. */
  READING,
  /** One string is false or worn: errors without a pattern, on this string only. */
  STRING,
  /** The nut slot of one string is high against its neighbours. */
  NUT_HIGH,
  /** The nut stands too far from fret 1. */
  NUT_FAR,
  /** The nut stands too near fret 1. */
  NUT_NEAR,
  /** One fret is out of place under all strings. */
  FRET,
  /** The action beyond the shop's target stretches the string sharp. */
  ACTION
}
