package sillet.acoustics.estimate;

/** The true note of a string now: the curve, its fret's place and its own straying, in cents. */
final class NoteEstimate {
  private final double cents;
  private final double[] slopes;
  private final double ownVariance;

  NoteEstimate(double cents, double[] slopes, double ownVariance) {
    this.cents = cents;
    this.slopes = slopes;
    this.ownVariance = ownVariance;
  }

  double cents() {
    return cents;
  }

  /** Adds the note's slopes times a weight. */
  void addTo(double[] sum, double weight) {
    for (int i = 0; i < slopes.length; i++) {
      sum[i] += weight * slopes[i];
    }
  }

  double[] slopes() {
    return slopes;
  }

  /** What the unknowns do not explain: straying, and the place of a fret never read. */
  double ownVariance() {
    return ownVariance;
  }
}
