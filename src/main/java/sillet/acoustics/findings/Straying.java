package sillet.acoustics.findings;

import java.util.Arrays;
import java.util.function.IntFunction;

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

  /** On a quiet instrument notes stray this far, cents; beyond it pitches do. */
  private static final double ALONE_AT_MOST = 0.245;

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
    double all = of(notes, even, notes::rowsOf);
    if (all <= ALONE_AT_MOST) {
      return even(all);
    }
    return new Straying(
        of(notes, even, string -> notes.rowsOf(string, true)),
        of(notes, even, string -> notes.rowsOf(string, false)));
  }

  double of(boolean lowNote) {
    return lowNote ? low : high;
  }

  /** What notes stray each by itself. */
  double alone(boolean lowNote) {
    return Math.min(of(lowNote), ALONE_AT_MOST);
  }

  /** What all notes of one pitch stray together, because the top resounds there. */
  double together(boolean lowNote) {
    double alone = alone(lowNote);
    return Math.sqrt(of(lowNote) * of(lowNote) - alone * alone);
  }

  /** Whether there is such a pitch. */
  boolean together() {
    return together(true) > 0 || together(false) > 0;
  }

  /**
   * Sd of a reading with this straying, note by note, instead of an even one. Readings of one note
   * stray alike: each of so many takes that many times the variance, so that their mean keeps it.
   */
  double in(double sd, double even, boolean lowNote, int timesRead) {
    double cents = alone(lowNote);
    return Math.sqrt(sd * sd - even * even + timesRead * cents * cents);
  }

  private static double of(NeckCase notes, double even, IntFunction<boolean[]> rows) {
    double[] ratios = new double[notes.strings()];
    int count = 0;
    for (int string = 0; string < notes.strings(); string++) {
      Residuals left = Residuals.of(notes.linear(), rows.apply(string));
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
