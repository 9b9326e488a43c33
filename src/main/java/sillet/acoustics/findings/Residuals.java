package sillet.acoustics.findings;

import sillet.acoustics.findings.LinearNeck.Amount;

/**
 * What some readings leave over.
 *
 * @param squares sum of squares of the residuals against their sd
 * @param free what that sum should be: how many of the readings are free
 */
record Residuals(double squares, double free) {
  static Residuals of(NeckCase notes, LinearNeck neck, int string) {
    return of(neck, notes.rowsOf(string));
  }

  static Residuals of(LinearNeck neck, boolean[] own) {
    double squares = 0;
    double free = 0;
    for (int row = 0; row < own.length; row++) {
      if (own[row]) {
        Amount alone = neck.alone(row);
        double sd = neck.sd(row);
        squares += neck.residual(row) * neck.residual(row) / (sd * sd);
        free += sd * sd / (alone.sd() * alone.sd());
      }
    }
    return new Residuals(squares, free);
  }

  double ratio() {
    return squares / free;
  }

  /** Twice the logarithm of the likelihood ratio of a spread wider than the readings'. */
  double gain() {
    return ratio() <= 1 ? 0 : squares - free - free * Math.log(ratio());
  }
}
