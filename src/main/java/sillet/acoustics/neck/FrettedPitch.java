package sillet.acoustics.neck;

import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.pitch.FretPositions;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.stiff.OpenTension;
import sillet.acoustics.stiff.StiffString;
import sillet.acoustics.wire.StringConstants;

/**
 * Pitch of fretted notes from geometry, stretch and stiffness.
 *
 * <p>With X_n = X0 / 2^(n/12), s and m the setbacks, b and c height at the nut and rise to the
 * saddle, b_n = b + bow at fret n: open length L0 = sqrt((X0 + s + m)^2 + c^2), sounding length L_n
 * = sqrt((X_n + s)^2 + (b_n + c)^2), length behind the fret L'_n over the point where the finger
 * presses, stretch Q = (L_n + L'_n - L0) / L0, tension T0 + grip EA Q, unit mass mu / (1 + Q), and
 * the pitch by {@link StiffString}. T0 is {@link OpenTension}: the open string is in tune.
 *
 * <p>Sources: lengths and stretch, M. B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1),
 * 683 (2024); bow, ends and the fixed point derived. Valid for setbacks of a few per cent of the
 * scale and clearances of a few per cent of the sounding length. Edge: a note whose length or
 * tension is used up is NaN.
 *
 * <p>An object stands for one string in one place and costs one search for its tension; each note
 * then is a handful of roots and one logarithm, and allocates nothing.
 */
public final class FrettedPitch {

  private final StringLie lie;
  private final Fretting fretting;
  private final double openTension;
  private final double openLength;
  private final double atNut;
  private final double rise;

  private FrettedPitch(StringLie lie, Fretting fretting, double openLength, double openTension) {
    this.lie = lie;
    this.fretting = fretting;
    this.openLength = openLength;
    this.openTension = openTension;
    this.rise = lie.clearances().rise(fretting.bodyJoint());
    this.atNut = lie.clearances().atNut(fretting.bodyJoint());
  }

  /** The string tuned to pitch, fretted as usual; not solved where no tension does it. */
  public static Outcome<FrettedPitch> of(StringLie lie) {
    return of(lie, Fretting.USUAL);
  }

  /** As {@link #of(StringLie)}, with slip, finger depth and body joint given. */
  public static Outcome<FrettedPitch> of(StringLie lie, Fretting fretting) {
    double along = lie.scale() + lie.saddleSetback() + lie.nutSetback();
    if (!(along > 0)) {
      return Outcome.notSolved("the setbacks leave no length");
    }
    double length = hypot(along, lie.clearances().rise(fretting.bodyJoint()));
    return OpenTension.of(lie.constants(), length, lie.openHz(), lie.ends())
        .map(tension -> new FrettedPitch(lie, fretting, length, tension));
  }

  /** {@link #centsAgainstOpen(int)} of a string fretted as usual; NaN where it is not solved. */
  public static double centsAgainstOpen(StringLie lie, int fret) {
    Outcome<FrettedPitch> pitch = of(lie);
    if (pitch instanceof Solved<FrettedPitch> solved) {
      return solved.value().centsAgainstOpen(fret);
    }
    FretPositions.requireFret(fret);
    return Double.NaN;
  }

  /** {@link #centsAgainstHarmonic(int)} of a string fretted as usual; NaN where not solved. */
  public static double centsAgainstHarmonic(StringLie lie, int fret) {
    Outcome<FrettedPitch> pitch = of(lie);
    if (pitch instanceof Solved<FrettedPitch> solved) {
      return solved.value().centsAgainstHarmonic(fret);
    }
    FretPositions.requireFret(fret);
    return Double.NaN;
  }

  /**
   * Cents of the note at {@code fret} above its place in equal temperament over the open string.
   *
   * @param fret 0 (which gives 0) to 48
   * @throws IllegalArgumentException for any other fret
   */
  public double centsAgainstOpen(int fret) {
    FretPositions.requireFret(fret);
    if (fret == 0) {
      return 0;
    }
    return Cents.between(lie.openHz() * EqualTemperament.ratio(fret), hz(fret));
  }

  /**
   * Cents of the note at {@code fret} above its place in equal temperament over half the frequency
   * of the harmonic at fret 12. Differs from {@link #centsAgainstOpen(int)} by {@link
   * #harmonicAgainstTwiceOpen()} at every fret, the open string included.
   */
  public double centsAgainstHarmonic(int fret) {
    return centsAgainstOpen(fret) - harmonicAgainstTwiceOpen();
  }

  /** Cents by which the harmonic at fret 12 stands above twice the open string. */
  public double harmonicAgainstTwiceOpen() {
    StringConstants string = lie.constants();
    double delta = StiffString.bendingLength(string.bendingStiffness(), openTension);
    double alpha = lie.ends().open();
    double harmonic = StiffString.hz(2, openLength, openTension, string.unitMass(), delta, alpha);
    return Cents.between(2 * lie.openHz(), harmonic);
  }

  /** Frequency in Hz of the note at {@code fret}; for fret 0 the open string's. */
  public double hz(int fret) {
    FretPositions.requireFret(fret);
    if (fret == 0) {
      return lie.openHz();
    }
    StringConstants string = lie.constants();
    double sounding = soundingLength(fret);
    double stretch = stretch(fret, sounding);
    double tension = openTension + fretting.grip() * string.axialStiffness() * stretch;
    double delta = StiffString.bendingLength(string.bendingStiffness(), tension);
    double unitMass = string.unitMass() / (1 + stretch);
    return StiffString.hz(1, sounding, tension, unitMass, delta, lie.ends().fretted());
  }

  /** Stretch Q of the string when fretted, as a share of the open length; 0 for fret 0. */
  public double stretch(int fret) {
    FretPositions.requireFret(fret);
    return fret == 0 ? 0 : stretch(fret, soundingLength(fret));
  }

  /** Tension of the open string in N. */
  public double openTension() {
    return openTension;
  }

  /** Length of the open string from nut to saddle in m. */
  public double openLength() {
    return openLength;
  }

  private double soundingLength(int fret) {
    double along = lie.scale() / EqualTemperament.ratio(fret) + lie.saddleSetback();
    return hypot(along, heightAtNut(fret) + rise);
  }

  private double stretch(int fret, double sounding) {
    double toSaddle = lie.scale() / EqualTemperament.ratio(fret);
    double behind = lie.scale() - toSaddle + lie.nutSetback();
    double space =
        lie.scale() * (1 / EqualTemperament.ratio(fret - 1) - 1 / EqualTemperament.ratio(fret));
    double depth = fretting.fingerDepth() + fretting.fingerShare() * space;
    double height = heightAtNut(fret);
    double sounded = toSaddle + lie.saddleSetback();
    if (fretting.press() == 0 || depth == 0) {
      // the string goes on down its slope to the finger, then straight to the nut
      double down = depth / sounded;
      double toFinger = sounding * down;
      double toNut = hypot(behind - depth, height + (height + rise) * down);
      return (sounding + toFinger + toNut - openLength) / openLength;
    }
    double below = (height + rise) * depth / sounded + fretting.press();
    double pressed = hypot(depth, below) + backToNut(behind, depth, below, height, space);
    return (sounding + pressed - openLength) / openLength;
  }

  /** From the finger to the nut, over the fret before where the string meets it. */
  private static double backToNut(
      double behind, double depth, double below, double height, double space) {
    double rest = behind - space;
    double overFretBefore = -below + (height + below) * (space - depth) / (behind - depth);
    if (overFretBefore >= 0 || !(rest > 0) || depth >= space) {
      return hypot(behind - depth, height + below);
    }
    return hypot(space - depth, below) + hypot(rest, height);
  }

  /** Height of the nut's edge over the top of the fret, which the bow puts lower: b_n. */
  private double heightAtNut(int fret) {
    return atNut + lie.clearances().bowAt(fret, fretting.bodyJoint());
  }

  /** Plain root: the operands are far from overflow, and Math.hypot is ten times slower. */
  private static double hypot(double x, double y) {
    return Math.sqrt(x * x + y * y);
  }
}
