package sillet.acoustics.forecast;

/** How a string feels under the hand against another tension. */
public enum Feel {
  /** More than {@link #SAME_WITHIN} less tension. */
  LIGHTER,
  /** Within {@link #SAME_WITHIN}. */
  SAME,
  /** More than {@link #SAME_WITHIN} more tension. */
  HEAVIER;

  /**
   * What counts as the same, as a share: 5 %, about half a semitone of tuning or a quarter of a
   * thousandth of an inch on a plain first string. Common practice, no source.
   */
  public static final double SAME_WITHIN = 0.05;

  /**
   * The feel of one tension against another.
   *
   * @param tension in N, not negative
   * @param against in N, above zero: the same string before, or the mean of the set for a
   *     comparison with equal tension
   * @throws IllegalArgumentException where a tension is out of range
   */
  public static Feel of(double tension, double against) {
    if (!(tension >= 0) || !(against > 0) || Double.isInfinite(tension + against)) {
      throw new IllegalArgumentException("no tensions to compare: " + tension + ", " + against);
    }
    double share = tension / against - 1;
    if (Math.abs(share) <= SAME_WITHIN) {
      return SAME;
    }
    return share < 0 ? LIGHTER : HEAVIER;
  }
}
