package sillet.acoustics.moves;

import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;

/**
 * What is expected of a string before its readings: a saddle about where it should be, a nut about
 * where it should be, a stretch about as the heights say. The three unknowns are counted in their
 * standard deviations. All figures are chosen to be wide; common practice, no source.
 */
final class Prior {
  static final int UNKNOWNS = 3;

  /** The saddle: 10 cents at fret 12, 3.7 mm on a guitar. */
  private static final double SADDLE_CENTS = 10;

  /** The nut edge, metres. */
  private static final double NUT = 4e-4;

  /** Logarithm of the stretch: how hard and how far behind the fret it is pressed, heights. */
  private static final double STRETCH = 0.4;

  /** A fret's place, metres; trade texts call 0.08 mm good slotting. */
  private static final double FRET_PLACE = 5e-5;

  /**
   * What the shape of the model's curve may miss at any fret, cents. The notes of a measured
   * flat-top guitar stray from a smooth curve by 0.33 to 1.32 cents rms, string by string, their
   * own scatter of reading included (J. M. Hjerrild, M. G. Christensen, ICASSP 2019, open data).
   */
  private static final double SHAPE_CENTS = 0.5;

  private final StringLie middle;
  private final double stretchSd;

  private Prior(StringLie middle, double stretchSd) {
    this.middle = middle;
    this.stretchSd = stretchSd;
  }

  /** Around the lie that is true at fret 12. */
  static Outcome<Prior> of(StringLie lie, Reference against) {
    double stretchSd = Math.hypot(STRETCH, lie.constants().relativeSd());
    return OctaveNote.with(lie, against, 0).map(middle -> new Prior(middle, stretchSd));
  }

  /** The lie so many standard deviations from the middle. */
  StringLie at(double[] unknowns) {
    double saddleSd = -SADDLE_CENTS / OctaveNote.plainSlope(middle);
    return middle
        .withSaddleSetback(middle.saddleSetback() + saddleSd * unknowns[0])
        .withNutSetback(middle.nutSetback() + NUT * unknowns[1])
        .withConstants(middle.constants().stretchedBy(Math.exp(stretchSd * unknowns[2])));
  }

  /** Standard deviation of what a fret's true note has over the model's, cents. */
  double fretSd(int fret) {
    double place = Cents.ofSmallShare(FRET_PLACE * EqualTemperament.ratio(fret) / middle.scale());
    return Math.hypot(place, SHAPE_CENTS);
  }
}
