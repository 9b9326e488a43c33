package sillet.acoustics.estimate;

import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.Fretting;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.stiff.EndCondition;
import sillet.acoustics.wire.StringConstants;

/** One occasion of one string: its quantities by the unknowns, its situation by the quantities. */
final class OccasionModel {
  private static final int BODY_JOINT = Fretting.USUAL.bodyJoint();

  /** Largest logarithm of a factor that is tried: far beyond any string, far from overflow. */
  private static final double FARTHEST = 30;

  private final int string;
  private final Occasion occasion;
  private final Sum[] sums;

  OccasionModel(int string, Occasion occasion, Sum[] sums) {
    this.string = string;
    this.occasion = occasion;
    this.sums = sums;
  }

  int string() {
    return string;
  }

  Occasion occasion() {
    return occasion;
  }

  /** Frets read on this occasion, in the order of the readings. */
  int[] frets() {
    return occasion.readings().stream().mapToInt(FretReading::fret).toArray();
  }

  Sum sum(Quantity quantity) {
    return sums[quantity.place()];
  }

  double[] quantities(double[] point, double[] sds) {
    double[] values = new double[Quantity.COUNT];
    for (int i = 0; i < values.length; i++) {
      values[i] = sums[i].at(point, sds);
    }
    return values;
  }

  /** The situation these quantities make, the frets where they should be. */
  StringSituation situation(double[] quantities, FretPlaces frets) {
    StringLie typed = occasion.lie();
    StringLie lie =
        new StringLie(
            constants(typed.constants(), quantities),
            typed.openHz(),
            typed.scale(),
            of(quantities, Quantity.SADDLE),
            of(quantities, Quantity.NUT),
            new Clearances(
                of(quantities, Quantity.ACTION),
                of(quantities, Quantity.GAP),
                of(quantities, Quantity.RELIEF)),
            ends(of(quantities, Quantity.HELD), of(quantities, Quantity.HELD_OPEN)));
    double grip = 1 / (1 + factor(of(quantities, Quantity.AFTER_LENGTH)));
    double press = factor(of(quantities, Quantity.PRESS));
    return new StringSituation(
        lie, new Fretting(grip, 0, Expectations.FINGER_SHARE, press, BODY_JOINT), frets);
  }

  /**
   * Kept finite, so that a trial step of contradictory readings ends in words, not in an accident.
   */
  private static double factor(double logarithm) {
    return Math.exp(Math.max(-FARTHEST, Math.min(FARTHEST, logarithm)));
  }

  private static StringConstants constants(StringConstants typed, double[] quantities) {
    double core = of(quantities, Quantity.CORE);
    double modulus = of(quantities, Quantity.MODULUS);
    return new StringConstants(
        typed.unitMass() * factor(of(quantities, Quantity.MASS)),
        typed.axialStiffness() * factor(2 * core + modulus),
        typed.bendingStiffness() * factor(4 * core + modulus + of(quantities, Quantity.BENDING)),
        typed.relativeSd(),
        typed.spread());
  }

  /** Only the two sums count; the parts are any that an end can have. */
  private static EndCondition ends(double held, double heldOpen) {
    double least = Math.max(0, Math.max(held - 1, -heldOpen));
    double most = Math.min(1, Math.min(held, 1 - heldOpen));
    double fret = Math.max(least, Math.min(most, held / 2));
    return new EndCondition(share(held - fret), share(fret + heldOpen), share(fret));
  }

  private static double share(double value) {
    return Math.max(0, Math.min(1, value));
  }

  private static double of(double[] quantities, Quantity quantity) {
    return quantities[quantity.place()];
  }
}
