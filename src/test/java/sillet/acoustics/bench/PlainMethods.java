package sillet.acoustics.bench;

import java.util.List;
import sillet.acoustics.neck.CurveFit;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.readings.FretReading;

/** What can be reckoned without a model, to compare with. */
final class PlainMethods {
  private static final int FRETS = 12;

  private PlainMethods() {}

  /** The usual rule: fret 12 alone, cents x scale/1731.2. */
  static Move usualRule(double scale, FretReading octave) {
    double metresPerCent = scale / Cents.PER_UNIT;
    double move = octave.cents() * metresPerCent;
    double half = 1.96 * octave.sd() * metresPerCent;
    return new Move(move, move - half, move + half, 0);
  }

  /**
   * Least squares of 1/(g - 1), 1, g - 1 over all readings, and the move that is best for the
   * fitted notes 1 to 12, a millimetre of saddle worth (g - 1) 1731.2/scale cents and one of nut
   * 1731.2/scale.
   */
  static Move linearFit(double scale, List<FretReading> readings, boolean nutMoves) {
    CurveFit fit =
        CurveFit.of(
                readings.stream().mapToInt(FretReading::fret).toArray(),
                readings.stream().mapToDouble(FretReading::cents).toArray(),
                readings.stream().mapToDouble(FretReading::sd).toArray())
            .orElseThrow();
    double[] g = new double[3];
    double[] z = new double[2];
    for (int fret = 1; fret <= FRETS; fret++) {
      double rise = Math.pow(2, fret / 12.0) - 1;
      g[0]++;
      g[1] += rise;
      g[2] += rise * rise;
      z[0] += fit.centsAt(fret);
      z[1] += fit.centsAt(fret) * rise;
    }
    double metresPerCent = scale / Cents.PER_UNIT;
    if (!nutMoves) {
      return Move.plain(metresPerCent * z[1] / g[2], 0);
    }
    double spread = g[0] * g[2] - g[1] * g[1];
    double saddle = (g[0] * z[1] - g[1] * z[0]) / spread;
    double nut = (g[2] * z[0] - g[1] * z[1]) / spread;
    return Move.plain(metresPerCent * saddle, metresPerCent * nut);
  }
}
