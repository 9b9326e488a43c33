package sillet.desktop.visit.picture;

import sillet.logbook.instruments.Neck;
import sillet.logbook.strings.FittedString;

/** Finds out at which fret of the neck a short string has its own nut. */
public final class ShortNut {
  private static final double CLEARLY_SHORTER = 0.97;
  private static final int FRETS_IN_OCTAVE = 12;

  private ShortNut() {}

  /** 0, or the fret at which the string begins. */
  public static int startFret(FittedString string, Neck neck) {
    double share = string.scaleMm() / neck.scaleMm(string.number());
    if (share > CLEARLY_SHORTER) {
      return 0;
    }
    return (int) Math.rint(-FRETS_IN_OCTAVE * Math.log(share) / Math.log(2));
  }
}
