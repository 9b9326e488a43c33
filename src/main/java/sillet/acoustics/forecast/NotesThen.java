package sillet.acoustics.forecast;

import java.util.Arrays;
import java.util.SortedMap;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.Setbacks;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.wire.StringConstants;

/**
 * The notes that are to be true once the change is made, as a function of the situation now: the
 * same neck and hand, another string, pitch or height.
 */
final class NotesThen {
  private final StringChange change;
  private final NewWire wire;
  private final int[] frets;
  private final double[] weights;
  private final Reference against;

  NotesThen(StringChange change, SortedMap<Integer, Double> weights, Reference against) {
    this.change = change;
    this.wire = new NewWire(change);
    this.frets = weights.keySet().stream().mapToInt(Integer::intValue).toArray();
    this.weights = weights.values().stream().mapToDouble(Double::doubleValue).toArray();
    this.against = against;
  }

  boolean setsTheAction() {
    return change.actionThen().isPresent();
  }

  NewWire wire() {
    return wire;
  }

  int[] frets() {
    return frets;
  }

  double[] weights() {
    return weights;
  }

  /** The situation then, saddle and nut where they stand now. */
  StringSituation then(StringSituation now) {
    StringLie lie = now.lie();
    StringConstants constants = wire.likely(lie.constants());
    StringSituation then = now.withConstants(constants).withOpenHz(change.then().openHz());
    return change.actionThen().isPresent()
        ? then.withClearances(ActionChange.to(lie.clearances(), change.actionThen().getAsDouble()))
        : then;
  }

  static StringSituation at(StringSituation then, Setbacks place) {
    return then.withLie(then.lie().withSaddleSetback(place.saddle()).withNutSetback(place.nut()));
  }

  /** Cents of the notes aimed at; NaN where no tension brings the string to pitch. */
  double[] cents(StringSituation then) {
    double[] cents = new double[frets.length];
    if (FrettedPitch.of(then.lie(), then.fretting()) instanceof Solved<FrettedPitch> solved) {
      FrettedPitch pitch = solved.value();
      for (int i = 0; i < frets.length; i++) {
        double note =
            against == Reference.HARMONIC
                ? pitch.centsAgainstHarmonic(frets[i])
                : pitch.centsAgainstOpen(frets[i]);
        cents[i] = note + then.placeCents(frets[i]);
      }
    } else {
      Arrays.fill(cents, Double.NaN);
    }
    return cents;
  }
}
