package sillet.acoustics.virtual;

import sillet.acoustics.virtual.StringPlan.Construct;

/**
 * What one make of strings has in every gauge.
 *
 * @param modulus of its music wire, Pa
 * @param core times the usual share of the core in the diameter
 * @param hexagon whether a wound string's core has six sides
 * @param stretch of nylon: axial stiffness over tension
 * @param bending of nylon: bending length over that of a solid rod
 */
record StringMake(double modulus, double core, boolean hexagon, double stretch, double bending) {
  /** How much a string of the same make, but another gauge, differs: as a share, one sd. */
  private static final double SCATTER = 0.03;

  static StringMake draw(Luck luck, StringPlan plan, Kind kind) {
    boolean wound = plan.construction() == Construct.WOUND_NYLON;
    return new StringMake(
        luck.between(190e9, 207e9),
        luck.normal(1, kind.coreScatter()),
        luck.chance(0.5),
        luck.normal(wound ? 50 : 53, 6),
        wound ? luck.between(0.2, 0.6) : luck.normal(0.5, 0.03));
  }

  /** Another gauge of the same make. */
  StringMake anotherGauge(Luck luck) {
    return new StringMake(
        modulus,
        core * luck.normal(1, SCATTER),
        hexagon,
        stretch * luck.normal(1, SCATTER),
        bending * luck.normal(1, SCATTER));
  }
}
