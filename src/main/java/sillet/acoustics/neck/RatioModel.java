package sillet.acoustics.neck;

import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;

/**
 * The fretted note from pure ratios, without a tension or a mass: the model of M. B. Anderson, R.
 * G. Beausoleil, "Classical guitar intonation and compensation: The well-tempered guitar", J.
 * Acoust. Soc. Am. 156(1), 683 (2024). Kept beside {@link FrettedPitch} because published setbacks
 * and the closed formulas rest on it.
 *
 * <p>cents = 1200 log2(L0 / (gamma L_n)) + 600 log2(1 + Q) + 600 log2(1 + kappa Q) + 1200
 * log2(S(gamma beta) / S(beta)), S(x) = 1 + x + (1 + pi^2 / 2) x^2, gamma = 2^(n/12), with the
 * exact lengths. It differs from the full model in that kappa and beta stay what they are when the
 * saddle moves (the string is not retuned), one end is clamped, and the neck is straight.
 *
 * @param kappa EA / T of the open string
 * @param beta bending length over scale, sqrt(EI / T) / X0
 * @param scale nominal scale X0 in m, above zero
 * @param atNut height b over the plane of the frets at the nut, in m
 * @param rise further height c at the saddle, in m
 * @param fingerDepth how far behind the fret the string meets the board, in m
 */
public record RatioModel(
    double kappa, double beta, double scale, double atNut, double rise, double fingerDepth)
    implements SetbackCurve {

  private static final double SECOND_ORDER = 1 + Math.PI * Math.PI / 2;

  /** Refuses, as the caller's bug, a scale that is not above zero and anything not finite. */
  public RatioModel {
    if (!(scale > 0) || !Double.isFinite(scale + kappa + beta + atNut + rise + fingerDepth)) {
      throw new IllegalArgumentException("scale above zero and finite numbers are needed");
    }
  }

  @Override
  public double cents(int fret, Setbacks at) {
    double gamma = EqualTemperament.ratio(fret);
    double stretch = stretch(fret, at);
    double stiffness = stiffness(gamma * beta) / stiffness(beta);
    double length = openLength(at) / (gamma * soundingLength(fret, at));
    double tension = (1 + stretch) * (1 + kappa * stretch);
    return Cents.ofRatio(length * stiffness) + Cents.ofRatio(tension) / 2;
  }

  /** Stretch Q when fretted, as a share of the open length. */
  public double stretch(int fret, Setbacks at) {
    double toSaddle = scale / EqualTemperament.ratio(fret) + at.saddle();
    double behind = scale - scale / EqualTemperament.ratio(fret) + at.nut();
    double sounding = soundingLength(fret, at);
    double down = fingerDepth / toSaddle;
    double toNut = Math.hypot(behind - fingerDepth, atNut + (atNut + rise) * down);
    return (sounding * (1 + down) + toNut - openLength(at)) / openLength(at);
  }

  /** Cents that the slope of the string costs: -C (gamma^2 (b + c)^2 - c^2) / (2 X0^2). */
  public double heightCurvature(int fret) {
    double gamma = EqualTemperament.ratio(fret);
    double fretted = gamma * (atNut + rise);
    double share = (fretted * fretted - rise * rise) / (2 * scale * scale);
    return -Cents.ofSmallShare(share);
  }

  private double openLength(Setbacks at) {
    return Math.hypot(scale + at.saddle() + at.nut(), rise);
  }

  private double soundingLength(int fret, Setbacks at) {
    return Math.hypot(scale / EqualTemperament.ratio(fret) + at.saddle(), atNut + rise);
  }

  private static double stiffness(double x) {
    return 1 + x + SECOND_ORDER * x * x;
  }
}
