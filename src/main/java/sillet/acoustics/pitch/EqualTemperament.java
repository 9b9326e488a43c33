package sillet.acoustics.pitch;

/** Equal temperament: twelve equal semitones to the octave. */
public final class EqualTemperament {
  private EqualTemperament() {}

  /**
   * Frequency of a note.
   *
   * @param semitonesFromA4 0 for A4, positive is higher
   * @param referenceHz what A4 is, Hz, above zero
   * @return Hz
   */
  public static double frequency(int semitonesFromA4, double referenceHz) {
    return referenceHz * Math.pow(2, semitonesFromA4 / 12.0);
  }
}
