package sillet.acoustics.forecast;

import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.Fretting;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.stiff.EndCondition;

/**
 * A string under a capo. The fret it lies on becomes the nut: from there to the saddle the string
 * is the open string, and every fret above counts from it. With no slot between, the string starts
 * at the height of the fret's own top, so that stretch at the first frets is less than from the
 * nut.
 *
 * <p>The bow of the neck above the capo is again a parabola, of depth relief (1 - u)^2, u being the
 * place of the first fret above the capo. What a capo pulls the whole string sharp by its clamp is
 * tuned away and not counted. Plane geometry on the model of {@link FrettedPitch}.
 */
public final class Capo {
  /** Highest fret for a capo. */
  public static final int HIGHEST = 12;

  private static final int OCTAVE = 12;

  private Capo() {}

  /**
   * The capoed string as a string of its own: shorter, higher, held at a fret instead of the nut.
   *
   * @param lie without capo
   * @param fretting without capo
   * @param fret under the capo, 1 to {@value #HIGHEST}
   * @throws IllegalArgumentException for any other fret
   */
  public static StringLie lie(StringLie lie, Fretting fretting, int fret) {
    requireFret(fret);
    double ratio = EqualTemperament.ratio(fret);
    EndCondition ends = lie.ends();
    return new StringLie(
        lie.constants(),
        lie.openHz() * ratio,
        lie.scale() / ratio,
        lie.saddleSetback(),
        0,
        clearances(lie.clearances(), fretting.bodyJoint(), fret),
        new EndCondition(ends.saddle(), ends.fret(), ends.fret()));
  }

  /** How the capoed string is fretted: the body joint is nearer by the capo's fret. */
  public static Fretting fretting(Fretting fretting, int fret) {
    requireFret(fret);
    int joint = Math.max(OCTAVE + 1, fretting.bodyJoint() - fret);
    return fretting.withBodyJoint(joint);
  }

  /**
   * Cents of a note above the capo against the capoed open string, tuned to its place in equal
   * temperament.
   *
   * @param fret under the capo, 1 to {@value #HIGHEST}
   * @param above how many frets above the capo, 1 to 36
   */
  public static Outcome<Double> cents(StringLie lie, Fretting fretting, int fret, int above) {
    return FrettedPitch.of(lie(lie, fretting, fret), fretting(fretting, fret))
        .map(pitch -> pitch.centsAgainstOpen(above));
  }

  private static Clearances clearances(Clearances open, int joint, int fret) {
    double first = above(open, joint, fret, fret + 1);
    double twelfth = above(open, joint, fret, fret + OCTAVE);
    double whole = along(joint) - along(1);
    double left = Math.max(0, along(joint) - along(fret + 1)) / whole;
    return new Clearances(twelfth, first, open.relief() * left * left);
  }

  /** Clearance over a fret of the straight string from the top of the capo's fret to the saddle. */
  private static double above(Clearances open, int joint, int fret, int over) {
    double start = -open.bowAt(fret, joint);
    double atSaddle = open.atNut(joint) + open.rise(joint);
    double share = 1 - EqualTemperament.ratio(fret) / EqualTemperament.ratio(over);
    return start + (atSaddle - start) * share + open.bowAt(over, joint);
  }

  /** Distance from the nut as a share of the scale. */
  private static double along(int fret) {
    return 1 - 1 / EqualTemperament.ratio(fret);
  }

  private static void requireFret(int fret) {
    if (fret < 1 || fret > HIGHEST) {
      throw new IllegalArgumentException("capo at fret 1 to " + HIGHEST + ", not " + fret);
    }
  }
}
