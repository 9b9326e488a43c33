package sillet.acoustics.virtual;

/**
 * A taut string laid over points it cannot pass through: the upper hull of the points, in two
 * dimensions.
 */
final class TautPath {
  private final double[] x;
  private final double[] y;
  private final int corners;

  private TautPath(double[] x, double[] y, int corners) {
    this.x = x;
    this.y = y;
    this.corners = corners;
  }

  /** The path from the first point to the last over those between; x must rise. */
  static TautPath over(double[] pointX, double[] pointY) {
    double[] x = new double[pointX.length];
    double[] y = new double[pointX.length];
    int n = 0;
    for (int i = 0; i < pointX.length; i++) {
      while (n >= 2 && below(x, y, n, pointX[i], pointY[i])) {
        n--;
      }
      x[n] = pointX[i];
      y[n] = pointY[i];
      n++;
    }
    return new TautPath(x, y, n);
  }

  private static boolean below(double[] x, double[] y, int n, double nextX, double nextY) {
    double dx = x[n - 1] - x[n - 2];
    double dy = y[n - 1] - y[n - 2];
    return dx * (nextY - y[n - 2]) - dy * (nextX - x[n - 2]) >= 0;
  }

  /** Length along the path. */
  double length() {
    double sum = 0;
    for (int i = 1; i < corners; i++) {
      sum += Math.hypot(x[i] - x[i - 1], y[i] - y[i - 1]);
    }
    return sum;
  }

  /** Length of the last straight stretch, the part that sounds. */
  double lastStretch() {
    return Math.hypot(x[corners - 1] - x[corners - 2], y[corners - 1] - y[corners - 2]);
  }

  /** Where the last straight stretch begins. */
  double lastContact() {
    return x[corners - 2];
  }
}
