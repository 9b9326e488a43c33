package sillet.acoustics.wire;

/**
 * Stiffness of a string from pulling it: how the pitch rises with the stretch.
 *
 * <p>R = (L / f) df/dL = (kappa - 1) / 2, so kappa = EA / T = 2 R + 1. Source: M. B. Anderson, R.
 * G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024). The slope df/dL is the least-squares line
 * through the readings; f is the nominal pitch of the string, which is what their table follows.
 */
public final class StretchMeasurement {

  private StretchMeasurement() {}

  /**
   * R of a string whose mark, {@code length} away from its fixed end, was pulled along.
   *
   * @param displacement how far the mark stood from its first place at each reading, in m
   * @param hz the pitch read there, as many as displacements
   * @param length from the fixed end to the mark in m, above zero
   * @param nominalHz pitch the string is meant for, above zero
   * @throws IllegalArgumentException for fewer than two readings, lists of unequal length, no
   *     displacement at all, or a length or pitch that is not above zero
   */
  public static double sensitivity(
      double[] displacement, double[] hz, double length, double nominalHz) {
    if (displacement.length != hz.length || hz.length < 2) {
      throw new IllegalArgumentException("two readings or more, each with its displacement");
    }
    if (!(length > 0) || !(nominalHz > 0)) {
      throw new IllegalArgumentException("length and pitch must be above zero");
    }
    return slope(displacement, hz) * length / nominalHz;
  }

  /** kappa = EA / T of a string of sensitivity R. */
  public static double kappa(double sensitivity) {
    return 2 * sensitivity + 1;
  }

  private static double slope(double[] x, double[] y) {
    double meanX = mean(x);
    double meanY = mean(y);
    double sxy = 0;
    double sxx = 0;
    for (int i = 0; i < x.length; i++) {
      sxy += (x[i] - meanX) * (y[i] - meanY);
      sxx += (x[i] - meanX) * (x[i] - meanX);
    }
    if (!(sxx > 0)) {
      throw new IllegalArgumentException("the mark was not displaced");
    }
    return sxy / sxx;
  }

  private static double mean(double[] values) {
    double sum = 0;
    for (double value : values) {
      sum += value;
    }
    return sum / values.length;
  }
}
