package sillet.acoustics.pitch;

/**
 * Twelve equal semitones to the octave from a reference pitch.
 *
 * <p>f = A4 x 2^(k/12). A4 = 440 Hz is ISO 16:1975; any other reference can be given.
 */
public final class EqualTemperament {

  /** Standard tuning frequency of A4 in Hz (ISO 16:1975), tolerance 0.5 Hz. */
  public static final double STANDARD_A4 = 440;

  /** Semitones in one octave. */
  public static final int SEMITONES = 12;

  private static final int TABLE_SIZE = 49;

  private EqualTemperament() {}

  /** Ratios for semitones 0..48, held because a fretted pitch asks for them millions of times. */
  private static final double[] RATIOS = ratios();

  private static double[] ratios() {
    double[] table = new double[TABLE_SIZE];
    for (int n = 0; n < TABLE_SIZE; n++) {
      table[n] = Math.pow(2, n / (double) SEMITONES);
    }
    return table;
  }

  /** 2^(n/12): how many times higher than the open string fret n should sound; any n. */
  public static double ratio(int semitones) {
    if (semitones >= 0 && semitones < TABLE_SIZE) {
      return RATIOS[semitones];
    }
    return Math.pow(2, semitones / (double) SEMITONES);
  }

  /**
   * Frequency of a note.
   *
   * @param semitonesFromA4 0 for A4, -5 for E4, -29 for E2
   * @param a4 reference pitch in Hz, above zero
   * @throws IllegalArgumentException unless the reference is finite and above zero
   */
  public static double frequency(int semitonesFromA4, double a4) {
    if (!(a4 > 0) || Double.isInfinite(a4)) {
      throw new IllegalArgumentException("reference pitch must be above zero, is " + a4);
    }
    return a4 * ratio(semitonesFromA4);
  }
}
