package sillet.acoustics.neck;

/**
 * How a note is fretted: the finer parameters of {@link FrettedPitch}.
 *
 * @param grip share of the stretch that raises the tension, above 0 to 1: 1 = the string does not
 *     slip over nut and saddle; free sliding is length / (length + what lies beyond the ends). No
 *     slip is the better default: fretting changes the tension by 0.2 to 1 %, sliding over a nut
 *     needs several (capstan formula with the friction of T. Groves, J. A. Kemp, Archives of
 *     Acoustics)
 * @param fingerDepth how far behind the fret the string meets the board, in m, 0 or more: M. B.
 *     Anderson, R. G. Beausoleil (2024) argue for 0; 10 mm add up to 0.6 cents at fret 1
 * @param fingerShare the same as a share of the space between this fret and the one before, 0 to
 *     below 1; adds to {@code fingerDepth}
 * @param press how far the finger pushes the string below the line over the fret, in m, 0 or more;
 *     counts where the finger stands behind the fret. The string then may come to lie on the fret
 *     before
 * @param bodyJoint fret at the end of the neck's bow, from 13: 14 to 17 usually
 */
public record Fretting(
    double grip, double fingerDepth, double fingerShare, double press, int bodyJoint) {

  /** No slip, no depth, bow to fret 15. */
  public static final Fretting USUAL = new Fretting(1, 0, 0, 0, 15);

  /** Refuses, as the caller's bug, what is out of range. */
  public Fretting {
    if (!(grip > 0 && grip <= 1)) {
      throw new IllegalArgumentException("grip above 0 to 1, not " + grip);
    }
    if (!(fingerDepth >= 0) || Double.isInfinite(fingerDepth)) {
      throw new IllegalArgumentException("finger depth must not be negative, is " + fingerDepth);
    }
    if (!(fingerShare >= 0 && fingerShare < 1)) {
      throw new IllegalArgumentException("finger share 0 to below 1, not " + fingerShare);
    }
    if (!(press >= 0) || Double.isInfinite(press)) {
      throw new IllegalArgumentException("press must not be negative, is " + press);
    }
    if (bodyJoint <= 12) {
      throw new IllegalArgumentException("body joint beyond fret 12, not " + bodyJoint);
    }
  }

  /** A string that is not pushed below the line over the fret. */
  public Fretting(double grip, double fingerDepth, int bodyJoint) {
    this(grip, fingerDepth, 0, 0, bodyJoint);
  }

  /** The same with the neck's bow ending elsewhere. */
  public Fretting withBodyJoint(int fret) {
    return new Fretting(grip, fingerDepth, fingerShare, press, fret);
  }
}
