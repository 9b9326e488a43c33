package sillet.acoustics.estimate;

import sillet.acoustics.pitch.Cents;
import sillet.acoustics.solve.Outcome;

/** Where a saddle makes fret 12 true against the open string. */
final class OctavePlace {
  private static final int OCTAVE = 12;
  private static final int MOST_STEPS = 8;

  /** Cents; the place is only what readings are held against. */
  private static final double NEAR = 1e-6;

  private OctavePlace() {}

  /** The saddle setback in m, by the plain length rule again and again. */
  static Outcome<Double> of(StringSituation situation) {
    double place = situation.lie().saddleSetback();
    for (int step = 0; step < MOST_STEPS; step++) {
      if (!(situation.lie().scale() / 2 + place > 0)) {
        break;
      }
      double cents = situation.withSaddleSetback(place).cents(OCTAVE);
      if (!Double.isFinite(cents)) {
        break;
      }
      if (Math.abs(cents) < NEAR) {
        return Outcome.solved(place);
      }
      place += cents * situation.lie().scale() / Cents.PER_UNIT;
    }
    return Outcome.notSolved("the string cannot be tuned to its pitch");
  }
}
