package sillet.acoustics.moves;

import java.util.OptionalDouble;

/**
 * The top of a fixed saddle, on which a string's break point is filed. Break points are counted
 * from the front edge, the one toward the neck, in m.
 *
 * @param thickness of the saddle, m
 * @param edge what is left standing at either edge, m
 */
public record SaddleTop(double thickness, double edge) {
  private static final double INCH = 0.0254;

  /** What is left at an edge: 0.4 mm, a shop figure (common practice, no source). */
  public static final double USUAL_EDGE = 4e-4;

  /** An eighth of an inch, 3.175 mm, with the usual edge. */
  public static final SaddleTop EIGHTH_INCH = new SaddleTop(INCH / 8, USUAL_EDGE);

  /** Three thirty-seconds of an inch, 2.381 mm, with the usual edge. */
  public static final SaddleTop THREE_THIRTY_SECONDS = new SaddleTop(3 * INCH / 32, USUAL_EDGE);

  /**
   * Checks the values.
   *
   * @throws IllegalArgumentException unless there is room between two edges
   */
  public SaddleTop {
    if (!(edge >= 0 && thickness > 2 * edge) || Double.isInfinite(thickness)) {
      throw new IllegalArgumentException("saddle " + thickness + " with edges " + edge);
    }
  }

  /** Whether a break point so far from the front edge leaves both edges standing. */
  public boolean holds(double breakPoint) {
    return breakPoint >= edge && breakPoint <= thickness - edge;
  }

  /** How far a break point lies beyond what the edges allow; 0 where it fits, m. */
  public double beyond(double breakPoint) {
    return Math.max(0, Math.max(edge - breakPoint, breakPoint - (thickness - edge)));
  }

  /**
   * Where the front edge goes so that all break points fit with the same to spare at both edges.
   *
   * @param places of the break points, m from anywhere, positive away from the neck; at least one
   * @return place of the front edge counted alike; empty where they spread too far for this saddle
   */
  public OptionalDouble frontEdgeFor(double... places) {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    for (double place : places) {
      least = Math.min(least, place);
      most = Math.max(most, place);
    }
    double front = (least + most - thickness) / 2;
    return most - least <= thickness - 2 * edge ? OptionalDouble.of(front) : OptionalDouble.empty();
  }
}
