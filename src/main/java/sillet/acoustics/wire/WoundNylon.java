package sillet.acoustics.wire;

/**
 * Wound nylon, whose core is a bundle of filaments that no geometry describes: tension and stretch
 * taken from measured strings by note.
 *
 * <p>Source: table 1.1 of M. B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024),
 * means over six sets at a scale of 650 mm: D3 68.3 N, kappa 50.7; A2 67.0 N, 50.5; E2 65.6 N,
 * 52.9. Between the notes linear in the logarithm of the frequency, level beyond. Sets spread by up
 * to 20 %. Bending: delta = k sqrt(kappa) radius with k = 0.47 (their measurement, +- 0.15); J.
 * Woodhouse, Acta Acustica united with Acustica 90, 945 (2004) measured two to five times less
 * bending stiffness. The question is open.
 */
final class WoundNylon {

  private static final double[] NOTE_HZ = {82.4069, 110, 146.8324};
  private static final double[] TENSION = {65.55, 66.97, 68.25};
  private static final double[] KAPPA = {52.9, 50.45, 50.65};
  private static final double BENDING_FACTOR = 0.47;

  private WoundNylon() {}

  static StringConstants estimate(
      StringSpec spec, double openHz, double scale, double sd, WireSpread spread) {
    double speed = 2 * scale * openHz;
    Double given = spec.unitMass();
    double unitMass = given != null ? given : at(TENSION, openHz) / (speed * speed);
    double tension = unitMass * speed * speed;
    double kappa = at(KAPPA, openHz);
    double delta = BENDING_FACTOR * Math.sqrt(kappa) * spec.diameter() / 2;
    return new StringConstants(unitMass, kappa * tension, delta * delta * tension, sd, spread);
  }

  private static double at(double[] values, double hz) {
    int last = NOTE_HZ.length - 1;
    if (hz <= NOTE_HZ[0]) {
      return values[0];
    }
    for (int i = 1; i <= last; i++) {
      if (hz <= NOTE_HZ[i]) {
        double part = Math.log(hz / NOTE_HZ[i - 1]) / Math.log(NOTE_HZ[i] / NOTE_HZ[i - 1]);
        return values[i - 1] + part * (values[i] - values[i - 1]);
      }
    }
    return values[last];
  }
}
