package sillet.acoustics.findings;

import java.util.Arrays;

/**
 * How far notes of this instrument stray from smooth curves, cents (sd): more at low notes, where
 * the air and the top of a guitar resound (about 100 and 200 Hz, from memory), and by the middling
 * string, so that one bad string does not pass for a resounding top.
 *
 * @param low below {@link #LOW_BELOW}
 * @param high above
 */
record Straying(double low, double high) {
  /** Hz. */
  static final double LOW_BELOW = 300;

  /** Fewer free readings of a string say nothing of it. */
  private static final double FEWEST_FREE = 2;

  /** Nothing strays less, nothing more than so many times what was learned. */
  private static final double LEAST = 0.15;

  private static final double MOST_TIMES = 2;

  static Straying even(double cents) {
    return new Straying(cents, cents);
  }

  /** Learned from a problem whose readings have an even straying in their sd. */
  static Straying of(NeckCase notes, double even) {
    return new Straying(of(notes, even, true), of(notes, even, false));
  }

  double of(boolean lowNote) {
    return lowNote ? low : high;
  }

  /** Sd of a reading with this straying instead of an even one. */
  double in(double sd, double even, boolean lowNote) {
    double cents = of(lowNote);
    return Math.sqrt(sd * sd - even * even + cents * cents);
  }

  private static double of(NeckCase notes, double even, boolean low) {
    double[] ratios = new double[notes.strings()];
    int count = 0;
    for (int string = 0; string < notes.strings(); string++) {
      Residuals left = Residuals.of(notes.linear(), notes.rowsOf(string, low));
      if (left.free() >= FEWEST_FREE) {
        ratios[count++] = left.ratio();
      }
    }
    if (count == 0) {
      return even;
    }
    Arrays.sort(ratios, 0, count);
    double middle = (ratios[(count - 1) / 2] + ratios[count / 2]) / 2;
    double reading = readingVariance(notes, even);
    double variance = middle * (reading + even * even) - reading;
    double most = MOST_TIMES * even;
    return Math.sqrt(Math.max(LEAST * LEAST, Math.min(variance, most * most)));
  }

  /** Mean variance of the readings alone, cents squared. */
  private static double readingVariance(NeckCase notes, double even) {
    double sum = 0;
    int count = 0;
    for (int row = 0; row < notes.rows().size(); row++) {
      if (notes.rows().get(row).fret() != NeckCase.HEIGHT) {
        double sd = notes.linear().sd(row);
        sum += sd * sd - even * even;
        count++;
      }
    }
    return sum / count;
  }
}
