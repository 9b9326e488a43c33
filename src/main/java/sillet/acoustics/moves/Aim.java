package sillet.acoustics.moves;

/** What a move is to make true. */
public enum Aim {
  /** Fret 12 agrees with its reference. */
  OCTAVE,
  /** The sum of squared cents over frets 1 to 12 against the open string is least. */
  NECK
}
