package sillet.acoustics.findings;

import sillet.acoustics.pitch.EqualTemperament;

/** What a cure would be worth to a player of frets 1 to 12. */
final class Worth {
  static final int FRETS = 12;

  private Worth() {}

  /**
   * By how much the root mean square falls when something is taken away and the saddle set anew
   * both times; below zero where it rises.
   *
   * @param cents at frets 1 to 12, place 0 unused
   * @param cause what the cause adds to them, likewise
   */
  static double of(double[] cents, double[] cause) {
    return rmsAtBestSaddle(cents) - rmsAtBestSaddle(without(cents, cause));
  }

  static double[] without(double[] cents, double[] cause) {
    return sum(cents, cause, -1);
  }

  static double[] with(double[] cents, double[] cause) {
    return sum(cents, cause, 1);
  }

  private static double[] sum(double[] cents, double[] cause, double sign) {
    double[] sum = new double[FRETS + 1];
    for (int fret = 1; fret <= FRETS; fret++) {
      sum[fret] = cents[fret] + sign * cause[fret];
    }
    return sum;
  }

  /** Root mean square over frets 1 to 12. */
  static double rms(double[] cents) {
    double squares = 0;
    for (int fret = 1; fret <= FRETS; fret++) {
      squares += cents[fret] * cents[fret];
    }
    return Math.sqrt(squares / FRETS);
  }

  /** A saddle takes what grows as 2^(n/12) - 1, to first order. */
  private static double rmsAtBestSaddle(double[] cents) {
    double along = 0;
    double square = 0;
    for (int fret = 1; fret <= FRETS; fret++) {
      double rise = EqualTemperament.ratio(fret) - 1;
      along += cents[fret] * rise;
      square += rise * rise;
    }
    double[] left = new double[FRETS + 1];
    for (int fret = 1; fret <= FRETS; fret++) {
      left[fret] = cents[fret] - along / square * (EqualTemperament.ratio(fret) - 1);
    }
    return rms(left);
  }
}
