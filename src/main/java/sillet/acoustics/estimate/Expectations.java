package sillet.acoustics.estimate;

/**
 * What is expected of instruments before anything is read, as standard deviations unless said
 * otherwise. Chosen to match how instruments, strings and hands vary; where no source is named:
 * common practice, no source.
 */
final class Expectations {
  /** A saddle stands this near to where fret 12 is true, cents. */
  static final double SADDLE_CENTS = 10;

  /** A saddle set by hand and rule, m. */
  static final double SADDLE_SET = 1e-4;

  /** A nut edge cut or shimmed by hand, m. */
  static final double NUT_SET = 5e-5;

  /** The nut's place, m. */
  static final double NUT = 2.5e-4;

  /** One slot's edge on it, m. */
  static final double SLOT = 3e-5;

  /** A fret's place, m; trade texts call 0.08 mm good slotting. */
  static final double FRET_PLACE = 3.5e-5;

  /**
   * Clamped ends of a note: 1.1 +- 0.2 measured on plain nylon (M. B. Anderson, R. G. Beausoleil,
   * J. Acoust. Soc. Am. 156(1), 683 (2024)).
   */
  static final double HELD = 0.2;

  /** Nut against fret. */
  static final double HELD_OPEN = 0.1;

  /** Expected way of the finger behind the fret, as a share of the space. */
  static final double FINGER_SHARE = 0.3;

  /** Expected push of the finger, m. */
  static final double PRESS_METRES = 7e-5;

  /** Logarithm of the push: one hand on all strings, and string by string. */
  static final double PRESS = 0.4;

  static final double PRESS_OWN = 0.5;

  /** Expected length that yields beyond nut and saddle, as a share of the string. */
  static final double AFTER_SHARE = 0.028;

  /** Its logarithm: the instrument's, and string by string. */
  static final double AFTER = 0.5;

  static final double AFTER_OWN = 0.7;

  /** Of a clearance over fret 12 that was not measured, what strings do not share, m. */
  static final double ACTION_OWN = 1.2e-4;

  /** Of a clearance over fret 1. */
  static final double GAP_OWN = 4e-5;

  /** Share of the variance of a string's constants that another string in its place has too. */
  static final double SAME_PLACE = 0.6;

  /**
   * How far a note strays from the model's curve, cents, to begin with; learned from the readings.
   * The notes of a measured flat-top guitar stray from a smooth curve by 0.33 to 1.32 cents rms,
   * their scatter of reading included (J. M. Hjerrild, M. G. Christensen, ICASSP 2019, open data).
   */
  static final double STRAY_CENTS = 0.14;

  /** How many notes that expectation counts for. */
  static final double STRAY_COUNT = 5;

  /** What a body does to an open string of mean mass, cents, to begin with; learned. */
  static final double BODY = 0.15;

  /** How many pitches that expectation counts for. */
  static final double BODY_COUNT = 2;

  /** Width of a body's resonance, semitones: a quality of 17. */
  static final double BODY_WIDTH = 1;

  private Expectations() {}
}
