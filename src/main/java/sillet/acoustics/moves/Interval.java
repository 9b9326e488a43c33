package sillet.acoustics.moves;

/** Width of intervals. */
final class Interval {
  /** Standard deviations either way that hold 95 % of a normal figure. */
  static final double NINETY_FIVE = 1.959964;

  private Interval() {}
}
