package sillet.acoustics.wire;

/**
 * Thickness of the core of a wound steel string as a share of the outer diameter, where nobody has
 * measured it.
 *
 * <p>Tables from memory, unverified, linear between the points and level beyond them:
 *
 * <ul>
 *   <li>guitar: .020 in 0.62, .026 0.56, .032 0.46, .036 0.44, .042 0.40, .046 0.39, .056 0.34,
 *       spread 12 %
 *   <li>mandolin (scale below 0.45 m): .024 0.53, .040 0.40, spread 12 %
 *   <li>bass (scale from 0.75 m, gauge from .045): .045 0.41, .065 0.33, .085 0.28, .105 0.25, .130
 *       0.22, spread 18 %; thinner strings of that scale are taken from the guitar's table
 * </ul>
 *
 * @param share core over outer diameter, between 0 and 1
 * @param relativeSd standard deviation of the share, as a share of it
 */
public record CoreShare(double share, double relativeSd) {

  private static final double INCH = 0.0254;
  private static final double MANDOLIN_SCALE_BELOW = 0.45;
  private static final double BASS_SCALE_FROM = 0.75;
  private static final double BASS_GAUGE_FROM = 0.0445 * INCH;

  private static final double GUITAR_SD = 0.12;
  private static final double BASS_SD = 0.18;

  private static final double[] GUITAR_GAUGES = {.020, .026, .032, .036, .042, .046, .056};
  private static final double[] GUITAR_SHARES = {0.62, 0.56, 0.46, 0.44, 0.40, 0.39, 0.34};
  private static final double[] MANDOLIN_GAUGES = {.024, .040};
  private static final double[] MANDOLIN_SHARES = {0.53, 0.40};
  private static final double[] BASS_GAUGES = {.045, .065, .085, .105, .130};
  private static final double[] BASS_SHARES = {0.41, 0.33, 0.28, 0.25, 0.22};

  /**
   * The usual share for a string of that diameter on an instrument of that scale.
   *
   * @param diameter outer diameter in m, above zero
   * @param scale nominal scale in m, above zero
   */
  public static CoreShare usual(double diameter, double scale) {
    double gauge = diameter / INCH;
    if (scale < MANDOLIN_SCALE_BELOW) {
      return new CoreShare(between(MANDOLIN_GAUGES, MANDOLIN_SHARES, gauge), GUITAR_SD);
    }
    if (scale >= BASS_SCALE_FROM && diameter >= BASS_GAUGE_FROM) {
      return new CoreShare(between(BASS_GAUGES, BASS_SHARES, gauge), BASS_SD);
    }
    return new CoreShare(between(GUITAR_GAUGES, GUITAR_SHARES, gauge), GUITAR_SD);
  }

  private static double between(double[] gauges, double[] shares, double gauge) {
    if (gauge <= gauges[0]) {
      return shares[0];
    }
    for (int i = 1; i < gauges.length; i++) {
      if (gauge <= gauges[i]) {
        double part = (gauge - gauges[i - 1]) / (gauges[i] - gauges[i - 1]);
        return shares[i - 1] + part * (shares[i] - shares[i - 1]);
      }
    }
    return shares[shares.length - 1];
  }
}
