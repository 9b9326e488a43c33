package sillet.acoustics.bench;

/** What can move beside the saddles. */
enum NutRoom {
  /** Nothing. */
  FIXED,
  /** The nut edge of every string by itself. */
  EACH,
  /** The nut as one piece. */
  WHOLE
}
