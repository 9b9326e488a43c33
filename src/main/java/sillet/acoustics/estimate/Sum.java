package sillet.acoustics.estimate;

import java.util.Arrays;

/** A quantity as what is expected of it plus unknowns, each in its own standard deviations. */
final class Sum {
  private double expected;
  private int[] unknowns = {};
  private double[] signs = {};

  Sum(double expected) {
    this.expected = expected;
  }

  Sum(Sum other) {
    this.expected = other.expected;
    this.unknowns = other.unknowns.clone();
    this.signs = other.signs.clone();
  }

  void expectMore(double by) {
    expected += by;
  }

  void add(int unknown, double sign) {
    unknowns = Arrays.copyOf(unknowns, unknowns.length + 1);
    signs = Arrays.copyOf(signs, signs.length + 1);
    unknowns[unknowns.length - 1] = unknown;
    signs[signs.length - 1] = sign;
  }

  boolean known() {
    return unknowns.length == 0;
  }

  double at(double[] point, double[] sds) {
    double value = expected;
    for (int i = 0; i < unknowns.length; i++) {
      value += signs[i] * sds[unknowns[i]] * point[unknowns[i]];
    }
    return value;
  }

  /** Standard deviation before anything is read. */
  double sd(double[] sds) {
    double squares = 0;
    for (int i = 0; i < unknowns.length; i++) {
      double one = signs[i] * sds[unknowns[i]];
      squares += one * one;
    }
    return Math.sqrt(squares);
  }

  /** Adds slope by this quantity to the slopes by the unknowns. */
  void chain(double slope, double[] sds, double[] slopes) {
    for (int i = 0; i < unknowns.length; i++) {
      slopes[unknowns[i]] += slope * signs[i] * sds[unknowns[i]];
    }
  }
}
