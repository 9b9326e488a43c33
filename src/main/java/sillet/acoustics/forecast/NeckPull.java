package sillet.acoustics.forecast;

import java.util.Collection;

/**
 * The sum of the strings' tensions, which bends the neck, now and then. By how much the relief
 * follows differs from neck to neck and is not forecast.
 *
 * @param now in N, above zero
 * @param then in N, not negative
 */
public record NeckPull(double now, double then) {

  /** Refuses, as the caller's bug, what is out of range. */
  public NeckPull {
    if (!(now > 0) || !(then >= 0) || Double.isInfinite(now + then)) {
      throw new IllegalArgumentException("no pull to compare: " + now + ", " + then);
    }
  }

  /** Sums of the tensions of all strings, in N. */
  public static NeckPull of(Collection<Double> now, Collection<Double> then) {
    return new NeckPull(sum(now), sum(then));
  }

  /** Change in N; positive = more pull. */
  public double change() {
    return then - now;
  }

  /** Change as a share of the pull now. */
  public double share() {
    return then / now - 1;
  }

  private static double sum(Collection<Double> tensions) {
    return tensions.stream().mapToDouble(Double::doubleValue).sum();
  }
}
