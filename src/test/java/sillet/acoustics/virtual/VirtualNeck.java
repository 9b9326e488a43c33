package sillet.acoustics.virtual;

import java.util.Arrays;

/**
 * Tops of the frets as the string meets them: x from the nominal nut edge toward the bridge, y up.
 * Place 0 is the nominal nut edge, not a fret.
 */
public final class VirtualNeck {
  static final int FRETS = 22;

  private final double scale;
  private final double[] x;
  private final double[] y;

  private VirtualNeck(double scale, double[] x, double[] y) {
    this.scale = scale;
    this.x = x;
    this.y = y;
  }

  /**
   * A neck bent to an arc of a circle from nut to body joint and straight beyond, with every fret a
   * little out of place.
   *
   * @param relief depth of the arc in its middle
   * @param joint fret at the body
   * @param placeErrors metres along the neck, by fret
   * @param heightErrors metres upward, by fret
   */
  static VirtualNeck bent(
      double scale, double relief, int joint, double[] placeErrors, double[] heightErrors) {
    double[] x = new double[FRETS + 1];
    double[] y = new double[FRETS + 1];
    double chord = place(scale, joint);
    for (int n = 0; n <= FRETS; n++) {
      x[n] = place(scale, n) + (n == 0 ? 0 : placeErrors[n]);
      y[n] = bow(relief, chord, x[n]) + (n == 0 ? 0 : heightErrors[n]);
    }
    return new VirtualNeck(scale, x, y);
  }

  /** The same neck with one fret elsewhere, by so much toward the bridge. */
  VirtualNeck withFretMoved(int fret, double by) {
    double[] moved = x.clone();
    moved[fret] += by;
    return new VirtualNeck(scale, moved, y);
  }

  private static double place(double scale, int fret) {
    return scale - scale * Math.exp(-fret * Math.log(2) / 12);
  }

  private static double bow(double relief, double chord, double x) {
    if (relief == 0 || x <= 0 || x >= chord) {
      return 0;
    }
    double half = chord / 2;
    double radius = (half * half + relief * relief) / (2 * relief);
    double off = x - half;
    return radius - relief - Math.sqrt(radius * radius - off * off);
  }

  /** Twice the way from nominal nut to fret 12 as laid out. */
  public double scale() {
    return scale;
  }

  /** Deepest gap under a straightedge laid over frets 1 and 14. */
  double relief() {
    double deepest = 0;
    for (int fret = 1; fret <= 14; fret++) {
      double along = (x[fret] - x[1]) / (x[14] - x[1]);
      deepest = Math.max(deepest, y[1] + along * (y[14] - y[1]) - y[fret]);
    }
    return deepest;
  }

  double x(int fret) {
    return x[fret];
  }

  double y(int fret) {
    return y[fret];
  }

  /** The first places along the neck. */
  double[] firstX(int count) {
    return Arrays.copyOf(x, count);
  }

  /** Their heights. */
  double[] firstY(int count) {
    return Arrays.copyOf(y, count);
  }
}
