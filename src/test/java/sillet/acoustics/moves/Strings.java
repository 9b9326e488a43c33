package sillet.acoustics.moves;

import java.util.List;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.StringConstants;

/** Strings that several tests use: constants, pitches and heights of physics table 2.8 [D]. */
final class Strings {
  static final double SCALE = 0.648;

  private Strings() {}

  /** Plain .010 in, E4. */
  static StringLie thin() {
    return lie(new StringConstants(3.977654e-4, 10134.15, 4.086342e-5, 0), 329.6276);
  }

  /** Plain .017 in, G3. */
  static StringLie thick() {
    return lie(new StringConstants(1.149542e-3, 29287.69, 3.412954e-4, 0), 195.9977);
  }

  /** Wound .046 over .018 in, E2. */
  static StringLie wound() {
    return lie(new StringConstants(7.635858e-3, 32834.64, 4.289679e-4, 0), 82.4069);
  }

  static StringLie lie(StringConstants constants, double hz) {
    return StringLie.nominal(constants, hz, SCALE, Clearances.overStraightNeck(0.5e-3, 2.5e-3));
  }

  /** A task of the usual kind. */
  static MoveTask octave(StringLie lie, FretReading... readings) {
    return new MoveTask(lie, List.of(readings), Reference.OPEN, Aim.OCTAVE, false);
  }

  static MoveTask neck(StringLie lie, boolean nutFree, List<FretReading> readings) {
    return new MoveTask(lie, readings, Reference.OPEN, Aim.NECK, nutFree);
  }
}
