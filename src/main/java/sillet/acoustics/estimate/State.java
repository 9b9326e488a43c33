package sillet.acoustics.estimate;

/**
 * A point of the unknowns and what it is counted in: both change together, since what is learned of
 * the readings changes what is expected of the unknowns.
 */
final class State {
  private final double[] sds;
  private double[] point;

  State(double[] sds) {
    this.sds = sds;
    this.point = new double[sds.length];
  }

  double[] sds() {
    return sds;
  }

  double[] point() {
    return point;
  }

  void moveTo(double[] other) {
    point = other;
  }

  /** The point so far along a step. */
  double[] along(double[] step, double length) {
    double[] next = point.clone();
    for (int i = 0; i < next.length; i++) {
      next[i] += length * step[i];
    }
    return next;
  }

  double value(int unknown) {
    return sds[unknown] * point[unknown];
  }

  /** Counts an unknown in another sd; it stays where it is. */
  void countIn(int unknown, double sd) {
    point[unknown] *= sds[unknown] / sd;
    sds[unknown] = sd;
  }
}
