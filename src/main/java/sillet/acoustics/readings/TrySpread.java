package sillet.acoustics.readings;

import java.util.Arrays;
import java.util.OptionalInt;

/**
 * Several tries of the same note taken together.
 *
 * @param median the middle try, or the mean of the two middle ones; any unit
 * @param sd standard deviation of that median, same unit
 * @param wildTry index of the try that lies apart from the others, if one does; it is named, not
 *     left out: the median hardly feels it, but the spread it makes widens {@code sd}
 */
public record TrySpread(double median, double sd, OptionalInt wildTry) {
  /** Sd of a median over that of a mean, many normal tries: sqrt(pi/2) = 1.2533. */
  private static final double MEDIAN_FACTOR = 1.25;

  /** Makes the median absolute deviation of normal tries their standard deviation. */
  private static final double MAD_FACTOR = 1.4826;

  /** How many standard deviations apart make a try wild. */
  private static final double WILD = 3.5;

  private static final int FEWEST_FOR_A_WILD_ONE = 3;

  /**
   * Takes tries together. With k tries and the sd s of one, the median's sd is 1.25 s/sqrt(k); the
   * factor belongs to many tries (3 have 1.16) and so errs to the wide side. The median of two is
   * their mean, which has s/sqrt(2); one try has s. In place of s stands the tries' own standard
   * deviation (k - 1) where that is larger.
   *
   * @param tries at least one, finite
   * @param sdOfOne standard deviation of one try, above zero, same unit
   * @return median, its sd, and the wild try
   * @throws IllegalArgumentException if there is no try or a value is not finite
   */
  public static TrySpread of(double[] tries, double sdOfOne) {
    if (tries.length == 0) {
      throw new IllegalArgumentException("no try");
    }
    for (double one : tries) {
      if (!Double.isFinite(one)) {
        throw new IllegalArgumentException("a try is " + one);
      }
    }
    if (!(sdOfOne > 0) || Double.isInfinite(sdOfOne)) {
      throw new IllegalArgumentException("sd of one try is " + sdOfOne);
    }
    double median = median(tries);
    double factor = tries.length < FEWEST_FOR_A_WILD_ONE ? 1 : MEDIAN_FACTOR;
    double one = Math.max(sdOfOne, ownSd(tries));
    return new TrySpread(
        median, factor * one / Math.sqrt(tries.length), wildTry(tries, median, sdOfOne));
  }

  private static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    int half = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[half] : (sorted[half - 1] + sorted[half]) / 2;
  }

  private static double ownSd(double[] tries) {
    if (tries.length < 2) {
      return 0;
    }
    double mean = Arrays.stream(tries).average().orElseThrow();
    double squares = Arrays.stream(tries).map(one -> (one - mean) * (one - mean)).sum();
    return Math.sqrt(squares / (tries.length - 1));
  }

  /** The try farthest off, if it is farther than chance allows by the others and by the tuner. */
  private static OptionalInt wildTry(double[] tries, double median, double sdOfOne) {
    if (tries.length < FEWEST_FOR_A_WILD_ONE) {
      return OptionalInt.empty();
    }
    double[] off = Arrays.stream(tries).map(one -> Math.abs(one - median)).toArray();
    int farthest = 0;
    for (int i = 1; i < off.length; i++) {
      farthest = off[i] > off[farthest] ? i : farthest;
    }
    double limit = WILD * Math.max(MAD_FACTOR * median(off), sdOfOne);
    return off[farthest] > limit ? OptionalInt.of(farthest) : OptionalInt.empty();
  }
}
