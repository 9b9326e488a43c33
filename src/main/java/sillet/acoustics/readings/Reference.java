package sillet.acoustics.readings;

/** What a fretted note was compared with. */
public enum Reference {
  /** The open string. */
  OPEN,
  /** The harmonic over fret 12, which runs sharp of the octave by the string's stiffness. */
  HARMONIC
}
