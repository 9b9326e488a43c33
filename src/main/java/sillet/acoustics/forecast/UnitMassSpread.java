package sillet.acoustics.forecast;

import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.CoreShare;
import sillet.acoustics.wire.StringSpec;

/**
 * How well the unit mass of a string is known: standard deviation as a share of it. Tension goes
 * with the unit mass.
 *
 * <p>Given: 1 %, a kitchen balance and a rule. Plain steel: 1 %, density and a diameter to 0.3 %.
 * Wound on a steel core: 2 % for the density and tightness of the winding, and what an estimated
 * core leaves open. Polymers and gut: 5 % (common practice, no source; the six sets of M. B.
 * Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024) spread by 4 to 6 % about the
 * mean of their note).
 */
final class UnitMassSpread {
  private static final double GIVEN = 0.01;
  private static final double PLAIN_STEEL = 0.01;
  private static final double WINDING = 0.02;
  private static final double SOFT = 0.05;

  private UnitMassSpread() {}

  static double of(Stringing stringing) {
    StringSpec spec = stringing.spec();
    Construction construction = spec.construction();
    if (spec.unitMass() != null) {
      return GIVEN;
    }
    if (!construction.steel()) {
      return SOFT;
    }
    if (!construction.wound()) {
      return PLAIN_STEEL;
    }
    return spec.core() != null ? WINDING : Math.hypot(WINDING, byCore(stringing));
  }

  /** Half of what the unit mass changes between a core one sd thinner and one sd thicker. */
  private static double byCore(Stringing stringing) {
    StringSpec spec = stringing.spec();
    CoreShare usual = CoreShare.usual(spec.diameter(), stringing.scale());
    double least = unitMass(stringing, usual.share() * (1 - usual.relativeSd()));
    double most = unitMass(stringing, usual.share() * (1 + usual.relativeSd()));
    return Math.abs(most - least) / (most + least);
  }

  private static double unitMass(Stringing stringing, double share) {
    StringSpec spec = stringing.spec();
    StringSpec withCore = spec.withCore(spec.coreShape(), share * spec.diameter());
    return stringing.with(withCore).constants().unitMass();
  }
}
