package sillet.acoustics.estimate;

/**
 * One thing that is not known, independent of the others before anything is read.
 *
 * @param kind what it is
 * @param string index of the string it belongs to, 0 first; {@link #SHARED} where all share it
 * @param fret it belongs to; 0 where it belongs to none
 * @param sd how far it may be from what is expected: m, or a natural logarithm, or a share of a
 *     clamped end
 */
public record Unknown(Kind kind, int string, int fret, double sd) {
  /** No string of its own. */
  public static final int SHARED = -1;

  /** What an unknown is about. */
  public enum Kind {
    /** Where a saddle stands, m away from the neck. */
    SADDLE,
    /** How far a saddle's known move missed, m. */
    SADDLE_SET,
    /** Where the nut stands, m away from the bridge. */
    NUT,
    /** Where a slot's edge stands on the nut, and how the open string strays, m. */
    SLOT,
    /** Logarithm of the thickness that carries the tension. */
    CORE,
    /** Logarithm of what moves both stiffnesses. */
    MODULUS,
    /** Logarithm of the bending stiffness alone. */
    BENDING,
    /** Logarithm of the unit mass. */
    MASS,
    /** Logarithm of how far the finger pushes the string down. */
    PRESS,
    /** Logarithm of the length beyond the ends that yields. */
    AFTER_LENGTH,
    /** Clamped ends of a fretted note. */
    HELD,
    /** Clamped ends of the open string over those of a fretted note. */
    HELD_OPEN,
    /** Clearance over fret 12, m. */
    ACTION,
    /** Clearance over fret 1, m. */
    GAP,
    /** Depth of the neck's bow, m. */
    RELIEF,
    /** What the body does to notes of one pitch and of those above it, cents. */
    BODY,
    /** Place of a fret, m toward the bridge. */
    FRET
  }
}
