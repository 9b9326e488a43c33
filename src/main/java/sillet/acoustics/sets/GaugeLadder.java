package sillet.acoustics.sets;

import sillet.acoustics.forecast.StringLoad;
import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.RootSearch;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

/**
 * Which gauge of the same construction pulls as hard as wanted, at the same pitch and scale.
 *
 * <p>Tension goes with unit mass, and unit mass with the square of the diameter of a plain string
 * (so that strings in fourths stand in the ratio 4 / 3: common practice, no source). Another gauge
 * of a string whose core is known keeps the core's share of the diameter; of one whose unit mass is
 * known it keeps how much heavier or lighter that is than the estimate [D].
 */
public final class GaugeLadder {

  private static final double THINNEST = 0.05e-3;
  private static final double THICKEST = 6e-3;
  private static final double STEP = 1.15;
  private static final RootSearch SEARCH = new RootSearch(1e-9, 200);

  private GaugeLadder() {}

  /**
   * A rung of the ladder.
   *
   * @param exact the diameter that gives the wanted tension, in m
   * @param usual the nearest gauge by tension that strings are usually sold in, in m
   * @param tension what the usual gauge pulls, in N
   * @param wanted what was asked for, in N
   */
  public record Rung(double exact, double usual, double tension, double wanted) {
    /** What the usual gauge misses, in N; positive pulls too hard. */
    public double miss() {
      return tension - wanted;
    }
  }

  /**
   * The rung of one string.
   *
   * @param string as it is; its construction, pitch and scale are kept
   * @param wanted tension in N, finite and above zero
   * @return not solved for wound nylon, and where no diameter from 0.05 to 6 mm does it
   * @throws IllegalArgumentException where the tension is out of range
   */
  public static Outcome<Rung> rung(Stringing string, double wanted) {
    if (!(wanted > 0) || Double.isInfinite(wanted)) {
      throw new IllegalArgumentException("tension must be above zero, is " + wanted);
    }
    if (string.spec().construction() == Construction.WOUND_NYLON) {
      return Outcome.notSolved("wound nylon is known by note, not by gauge");
    }
    for (double thin = THINNEST; thin < THICKEST; thin *= STEP) {
      if (tension(string, thin * STEP) >= wanted) {
        return SEARCH
            .find(diameter -> tension(string, diameter) - wanted, thin, thin * STEP)
            .map(exact -> nearest(string, wanted, exact));
      }
    }
    return Outcome.notSolved("no gauge of this construction pulls that hard here");
  }

  /**
   * The same string in another gauge.
   *
   * @param spec the string as it is
   * @param diameter the other gauge in m, above zero
   * @param string where it is strung: the estimates look at pitch and scale
   */
  static StringSpec inGauge(StringSpec spec, double diameter, Stringing string) {
    StringSpec other = StringSpec.of(diameter, spec.construction());
    Double core = spec.core();
    if (core != null && spec.construction().wound()) {
      other = other.withCore(spec.coreShape(), core / spec.diameter() * diameter);
    }
    Double unitMass = spec.unitMass();
    if (unitMass == null) {
      return other;
    }
    StringSpec bare =
        new StringSpec(spec.diameter(), spec.construction(), spec.coreShape(), core, null);
    double heavier = unitMass / estimate(bare, string);
    return other.withUnitMass(heavier * estimate(other, string));
  }

  private static double estimate(StringSpec spec, Stringing string) {
    return StringEstimate.of(spec, string.openHz(), string.scale()).unitMass();
  }

  private static Rung nearest(Stringing string, double wanted, double exact) {
    double best = exact;
    double bestTension = Double.NaN;
    for (double gauge : UsualGauges.of(string.spec().construction())) {
      double tension = tension(string, gauge);
      if (!(Math.abs(tension - wanted) >= Math.abs(bestTension - wanted))) {
        best = gauge;
        bestTension = tension;
      }
    }
    return new Rung(exact, best, bestTension, wanted);
  }

  /** Not a number where the string is too stiff for its length. */
  private static double tension(Stringing string, double diameter) {
    Outcome<StringLoad> load = StringLoad.of(string.with(inGauge(string.spec(), diameter, string)));
    return load instanceof Solved<StringLoad> solved ? solved.value().tension() : Double.NaN;
  }
}
