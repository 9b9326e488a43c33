package sillet.acoustics.neck;

import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.solve.Outcome;

/**
 * Saddle and nut setbacks that leave the least sum of squared cents over frets 1 to N.
 *
 * <p>Three ways, all of M. B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024):
 * the minimum itself, found by Gauss-Newton steps with central differences; the closed form, exact
 * for curves linear in both setbacks and within 0.02 mm of the minimum on their strings; the rule
 * of thumb, within 0.12 mm.
 */
public final class BestSetbacks {

  private static final int MAX_STEPS = 30;
  private static final double SETTLED = 1e-10;
  private static final double DIFFERENCE = 1e-5;

  private BestSetbacks() {}

  /**
   * The minimum.
   *
   * @param curve cents as a function of the setbacks; near to linear, as all strings are
   * @param frets how many frets from the first count; at least 2
   * @return setbacks to 1e-10 m; not solved where the curve has no number or the steps do not
   *     settle
   * @throws IllegalArgumentException for fewer than 2 frets
   */
  public static Outcome<Setbacks> optimum(SetbackCurve curve, int frets) {
    requireFrets(frets);
    Setbacks at = Setbacks.NONE;
    for (int step = 0; step < MAX_STEPS; step++) {
      Setbacks next = improve(curve, frets, at);
      double moved = Math.hypot(next.saddle() - at.saddle(), next.nut() - at.nut());
      if (Double.isNaN(moved) || Double.isInfinite(moved)) {
        return Outcome.notSolved("a fretted note has no pitch");
      }
      if (moved < SETTLED) {
        return Outcome.solved(next);
      }
      at = next;
    }
    return Outcome.notSolved("the best setbacks did not settle");
  }

  /**
   * The closed form: s = X0 (g0 Z1 - g1 Z0) / (C (g0 g2 - g1^2)), m = -X0 (g2 Z0 - g1 Z1) / (C (g0
   * g2 - g1^2)), g_k = sum (gamma - 1)^k, Z_k = sum (gamma - 1)^k cents_n, the cents without any
   * setback.
   *
   * @param scale nominal scale in m, above zero
   */
  public static Setbacks closedForm(SetbackCurve curve, int frets, double scale) {
    requireFrets(frets);
    double z0 = 0;
    double z1 = 0;
    for (int fret = 1; fret <= frets; fret++) {
      double cents = curve.cents(fret, Setbacks.NONE);
      z0 += cents;
      z1 += (EqualTemperament.ratio(fret) - 1) * cents;
    }
    double g0 = powerSum(0, frets);
    double g1 = powerSum(1, frets);
    double g2 = powerSum(2, frets);
    double unit = scale / (Cents.PER_UNIT * (g0 * g2 - g1 * g1));
    return new Setbacks(unit * (g0 * z1 - g1 * z0), -unit * (g2 * z0 - g1 * z1));
  }

  /**
   * The rule of thumb for frets 1 to 12: s = beta X0 + kappa / (4 X0) ((b + c)^2 - 7 b^2) - e, m =
   * -kappa / (2 X0) (5 b + c) b - e, e = (2 kappa / X0^2) (2 b + c)^2 d.
   */
  public static Setbacks ruleOfThumb(RatioModel model) {
    double scale = model.scale();
    double b = model.atNut();
    double c = model.rise();
    double atSaddle = b + c;
    double finger =
        2 * model.kappa() / (scale * scale) * (2 * b + c) * (2 * b + c) * model.fingerDepth();
    double saddle =
        model.beta() * scale
            + model.kappa() / (4 * scale) * (atSaddle * atSaddle - 7 * b * b)
            - finger;
    double nut = -model.kappa() / (2 * scale) * (5 * b + c) * b - finger;
    return new Setbacks(saddle, nut);
  }

  /** g_k = sum over frets 1 to N of (gamma - 1)^k. */
  public static double powerSum(int k, int frets) {
    double sum = 0;
    for (int fret = 1; fret <= frets; fret++) {
      sum += Math.pow(EqualTemperament.ratio(fret) - 1, k);
    }
    return sum;
  }

  /**
   * Root mean square of the cents over frets 1 to N and the open string, which counts as a zero:
   * the sum is divided by N + 1, as the published tables have it.
   */
  public static double rmsWithOpen(SetbackCurve curve, int frets, Setbacks at) {
    double sum = 0;
    for (int fret = 1; fret <= frets; fret++) {
      double cents = curve.cents(fret, at);
      sum += cents * cents;
    }
    return Math.sqrt(sum / (frets + 1));
  }

  /** One Gauss-Newton step: the least-squares answer of the curve's tangent. */
  private static Setbacks improve(SetbackCurve curve, int frets, Setbacks at) {
    double ss = 0;
    double sm = 0;
    double mm = 0;
    double sz = 0;
    double mz = 0;
    for (int fret = 1; fret <= frets; fret++) {
      double cents = curve.cents(fret, at);
      double bySaddle = slope(curve, fret, at, DIFFERENCE, 0);
      double byNut = slope(curve, fret, at, 0, DIFFERENCE);
      ss += bySaddle * bySaddle;
      sm += bySaddle * byNut;
      mm += byNut * byNut;
      sz += bySaddle * cents;
      mz += byNut * cents;
    }
    double determinant = ss * mm - sm * sm;
    double saddle = (sm * mz - mm * sz) / determinant;
    double nut = (sm * sz - ss * mz) / determinant;
    return new Setbacks(at.saddle() + saddle, at.nut() + nut);
  }

  private static double slope(
      SetbackCurve curve, int fret, Setbacks at, double saddle, double nut) {
    Setbacks more = new Setbacks(at.saddle() + saddle, at.nut() + nut);
    Setbacks less = new Setbacks(at.saddle() - saddle, at.nut() - nut);
    return (curve.cents(fret, more) - curve.cents(fret, less)) / (2 * DIFFERENCE);
  }

  private static void requireFrets(int frets) {
    if (frets < 2) {
      throw new IllegalArgumentException("two unknowns want two frets or more, not " + frets);
    }
  }
}
