package sillet.acoustics.estimate;

import java.util.Arrays;

/**
 * How far readings may lie from the curve: each by its own sd, and every note by a straying of its
 * own that all readings of it share. A robust weight makes a reading's variance larger.
 */
final class Noise {
  private final Readings readings;
  private final double[] weights;
  private double stray;

  Noise(Readings readings, double stray) {
    this.readings = readings;
    this.weights = new double[readings.count()];
    Arrays.fill(weights, 1);
    this.stray = stray;
  }

  Readings readings() {
    return readings;
  }

  double stray() {
    return stray;
  }

  void stray(double cents) {
    stray = cents;
  }

  double weight(int row) {
    return weights[row];
  }

  void weight(int row, double weight) {
    weights[row] = weight;
  }

  /** One over the variance of a reading about its own note. */
  double precision(int row) {
    double sd = readings.at(row).sd();
    return weights[row] / (sd * sd);
  }

  /** Precision of all readings of a note. */
  double precision(int[] note) {
    double sum = 0;
    for (int row : note) {
      sum += precision(row);
    }
    return sum;
  }

  /** Variance of a note's straying once its readings are taken in, cents squared. */
  double strayLeft(int[] note) {
    return stray * stray / (1 + stray * stray * precision(note));
  }

  /** Sd of one reading against the curve, no weight counted. */
  double sd(int row) {
    return Math.hypot(readings.at(row).sd(), stray);
  }
}
