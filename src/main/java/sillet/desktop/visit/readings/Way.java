package sillet.desktop.visit.readings;

/** Where the hand goes from a cell. */
public enum Way {
  /** Enter. */
  NEXT_STRING,
  /** Enter with Shift. */
  PREVIOUS_STRING,
  /** Tab. */
  NEXT_FRET,
  /** Tab with Shift. */
  PREVIOUS_FRET
}
