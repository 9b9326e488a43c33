package sillet.acoustics.findings;

import sillet.acoustics.findings.LinearNeck.Amount;
import sillet.acoustics.findings.LinearNeck.Trace;

/**
 * Two causes tried at once.
 *
 * @param first amount of the first
 * @param second amount of the second
 * @param gain what both together take off chi-square
 */
record Pair(Amount first, Amount second, double gain) {
  static Pair of(LinearNeck neck, Trace one, Trace other) {
    double a = one.information();
    double b = neck.common(one, other);
    double c = other.information();
    double determinant = a * c - b * b;
    double first = (c * one.score() - b * other.score()) / determinant;
    double second = (a * other.score() - b * one.score()) / determinant;
    return new Pair(
        new Amount(first, Math.sqrt(c / determinant)),
        new Amount(second, Math.sqrt(a / determinant)),
        first * one.score() + second * other.score());
  }
}
