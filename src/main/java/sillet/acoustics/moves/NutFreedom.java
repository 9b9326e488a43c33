package sillet.acoustics.moves;

/** How the edge of the nut can move. */
public enum NutFreedom {
  /** It stays. */
  FIXED,
  /** Every string's edge by itself. */
  EACH,
  /** The nut as a whole. */
  WHOLE
}
