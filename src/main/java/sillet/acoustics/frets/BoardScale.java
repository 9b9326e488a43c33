package sillet.acoustics.frets;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.pitch.FretPositions;

/**
 * The scale that measured frets themselves give, without regard to where the nut stands, and how
 * far the nut is from where that scale wants it.
 *
 * @param scale in m, twice fret 12 from the nut that the frets ask for
 * @param nutFar how much farther from the frets the nut stands than they ask, in m; positive makes
 *     every fretted note sharp against the open string
 */
public record BoardScale(double scale, double nutFar) {

  /** Frets that a scale by all of them needs: with fewer one bad fret decides. */
  public static final int LEAST_FRETS = 4;

  private static final int FIRST = 1;
  private static final int THIRTEENTH = 13;

  /**
   * By fret 1 and fret 13, whose distance is half of what is left behind fret 1: scale = 2 x
   * 2^(1/12) x (fret 13 - fret 1). A rule of repairers; identity of equal temperament.
   *
   * @param places measured, m from the nut's edge, by fret
   * @return nothing unless both frets were measured, the thirteenth beyond the first
   */
  public static Optional<BoardScale> byFirstAndThirteenth(SortedMap<Integer, Double> places) {
    Double first = places.get(FIRST);
    Double thirteenth = places.get(THIRTEENTH);
    if (first == null || thirteenth == null || !(thirteenth > first)) {
      return Optional.empty();
    }
    double scale = 2 * EqualTemperament.ratio(1) * (thirteenth - first);
    return Optional.of(new BoardScale(scale, first - FretPositions.fromNut(scale, FIRST)));
  }

  /**
   * By all measured frets: the median of the scales that every two of them give, and the median of
   * where each then puts the nut (P. K. Sen, 1968, from memory), so that one misplaced fret does
   * not drag the scale.
   *
   * @param places measured, m from the nut's edge, by fret; {@link #LEAST_FRETS} or more
   * @return nothing where there are fewer, or where they give no scale above zero
   */
  public static Optional<BoardScale> byAllFrets(SortedMap<Integer, Double> places) {
    int count = places.size();
    if (count < LEAST_FRETS) {
      return Optional.empty();
    }
    double[] shares = places.keySet().stream().mapToDouble(fret -> share(fret)).toArray();
    double[] at = places.values().stream().mapToDouble(Double::doubleValue).toArray();
    double[] scales = new double[count * (count - 1) / 2];
    int pair = 0;
    for (int i = 0; i < count; i++) {
      for (int j = i + 1; j < count; j++) {
        scales[pair++] = (at[j] - at[i]) / (shares[j] - shares[i]);
      }
    }
    double scale = median(scales);
    if (!(scale > 0)) {
      return Optional.empty();
    }
    double[] far = new double[count];
    for (int i = 0; i < count; i++) {
      far[i] = at[i] - scale * shares[i];
    }
    return Optional.of(new BoardScale(scale, median(far)));
  }

  /** What the nut's place alone costs every fretted note, in cents; positive is sharp. */
  public double nutCents() {
    return FretErrors.cents(scale + nutFar, scale);
  }

  /**
   * The errors of the frets against this scale, the nut's own error left out of them.
   *
   * @param places measured, m from the nut's edge, by fret
   */
  public FretErrors errors(Map<Integer, Double> places) {
    return FretErrors.of(scale, nutFar, places);
  }

  private static double share(int fret) {
    return FretPositions.fromNut(1, fret);
  }

  private static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    int middle = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
  }
}
