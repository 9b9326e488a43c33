package sillet.acoustics.stiff;

import java.util.function.DoubleUnaryOperator;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.RootSearch;

/**
 * Modes of a stiff string from its differential equation, each as a share of q times the ideal
 * fundamental sqrt(T / mu) / (2 L). Here to check and to bound {@link StiffString}.
 *
 * <p>With beta = delta / L, k1^2 - k2^2 = 1 / beta^2 and omega = (k2 / pi) sqrt(1 + (beta k2)^2):
 * one end clamped, tan k2 = (k2 / k1) tanh k1 (M. B. Anderson, R. G. Beausoleil, J. Acoust. Soc.
 * Am. 156(1), 683 (2024)); both clamped, 2 k1 k2 (1 - cosh k1 cos k2) + (k1^2 - k2^2) sinh k1 sin
 * k2 = 0 (derived from the same equation), divided by cosh k1 so that it does not overflow; both
 * pinned, k2 = q pi exactly.
 *
 * <p>Valid for beta from 1e-5 to 1 and any mode; the root is found to 1e-13 in k2. Every search
 * stands in the bracket of its mode: (q pi, q pi + pi / 2) and (q pi, (q + 1) pi).
 */
public final class ExactModes {

  private static final RootSearch SEARCH = new RootSearch(1e-13, 200);

  private ExactModes() {}

  /** Both ends pinned: sqrt(1 + (q pi beta)^2). */
  public static double pinned(double beta, int q) {
    require(beta, q);
    return Math.sqrt(1 + square(q * Math.PI * beta));
  }

  /** One end pinned, one clamped. */
  public static Outcome<Double> pinnedClamped(double beta, int q) {
    require(beta, q);
    DoubleUnaryOperator condition =
        k2 -> {
          double k1 = other(beta, k2);
          return k1 * Math.sin(k2) - k2 * Math.cos(k2) * Math.tanh(k1);
        };
    double low = q * Math.PI;
    return SEARCH.find(condition, low, low + Math.PI / 2).map(k2 -> share(beta, k2, q));
  }

  /** Both ends clamped. */
  public static Outcome<Double> clamped(double beta, int q) {
    require(beta, q);
    DoubleUnaryOperator condition =
        k2 -> {
          double k1 = other(beta, k2);
          double difference = 1 / square(beta);
          return 2 * k1 * k2 * (1 / Math.cosh(k1) - Math.cos(k2))
              + difference * Math.tanh(k1) * Math.sin(k2);
        };
    double low = q * Math.PI;
    return SEARCH.find(condition, low, low + Math.PI).map(k2 -> share(beta, k2, q));
  }

  private static double other(double beta, double k2) {
    return Math.sqrt(1 / square(beta) + square(k2));
  }

  private static double share(double beta, double k2, int q) {
    return k2 / (q * Math.PI) * Math.sqrt(1 + square(beta * k2));
  }

  private static double square(double x) {
    return x * x;
  }

  private static void require(double beta, int q) {
    if (!(beta >= 1e-5 && beta <= 1)) {
      throw new IllegalArgumentException("beta from 1e-5 to 1, not " + beta);
    }
    if (q < 1) {
      throw new IllegalArgumentException("modes count from 1, not " + q);
    }
  }
}
