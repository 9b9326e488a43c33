package sillet.acoustics.virtual;

import sillet.acoustics.virtual.StringPlan.Construct;

/**
 * Draws what a string really is: modulus of music wire 190 to 207 GPa, cores that scatter, round or
 * hexagonal, windings as a helix of round wire; nylon by measured tension and stretch (M. B.
 * Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024), table of string sets), its
 * bending from there down to what J. Woodhouse, Acta Acustica united with Acustica 90, 945 (2004)
 * measured.
 */
public final class WireMill {
  private static final double STEEL = 7850;

  private final Luck luck;

  WireMill(Luck luck) {
    this.luck = luck;
  }

  /** The wire and, for a wound one, how thick its core is across the flats. */
  public record Drawn(VirtualWire wire, double core) {}

  Drawn draw(StringPlan plan, Kind kind, double scale) {
    double diameter = plan.diameter() * luck.normal(1, 0.003);
    double modulus = luck.between(190e9, 207e9);
    if (plan.construction().nylon()) {
      return new Drawn(nylon(plan, diameter, scale), diameter);
    }
    if (plan.construction() == Construct.PLAIN_STEEL) {
      double area = Math.PI / 4 * diameter * diameter;
      double second = area * diameter * diameter / 16;
      double density = luck.normal(STEEL, 25);
      return new Drawn(new VirtualWire(density * area, modulus * area, modulus * second), diameter);
    }
    double core = diameter * plan.coreShare() * luck.normal(1, kind.coreScatter());
    core = Math.min(core, 0.8 * diameter);
    return new Drawn(wound(plan, diameter, core, modulus), core);
  }

  /**
   * The string of another set, tuned to another pitch. Nylon is softer under less stress: modulus
   * 4.5 + 39 s GPa, s the stress in GPa (J. Woodhouse, N. Lynch-Aird, Acta Acustica united with
   * Acustica 105, 516 (2019), as quoted elsewhere); the filaments of a wound one carry about 0.15
   * GPa (assumed).
   */
  Drawn redraw(StringPlan usual, StringPlan tuned, Kind kind, double scale) {
    StringPlan fresh =
        new StringPlan(usual.hz(), tuned.gauge(), usual.construction(), usual.coreShare());
    Drawn drawn = draw(fresh, kind, scale);
    if (!usual.construction().nylon()) {
      return drawn;
    }
    VirtualWire wire = drawn.wire();
    boolean wound = usual.construction() == Construct.WOUND_NYLON;
    double wider = wound ? tuned.gauge() / usual.gauge() : 1;
    double speed = 2 * scale * usual.hz();
    double area = Math.PI / 4 * tuned.diameter() * tuned.diameter();
    double stress = wound ? 0.15 : wire.slackMass() * speed * speed / area / 1e9;
    double less = Math.pow(tuned.hz() / usual.hz(), 2);
    double softer = (4.5 + 39 * stress * less) / (4.5 + 39 * stress);
    return new Drawn(
        new VirtualWire(
            wire.slackMass() * wider * wider,
            wire.axial() * wider * wider * softer,
            wire.bending() * Math.pow(wider, 4) * softer),
        drawn.core());
  }

  private VirtualWire wound(StringPlan plan, double diameter, double core, double modulus) {
    boolean hexagon = luck.chance(0.5);
    double area = hexagon ? Math.sqrt(3) / 2 * core * core : Math.PI / 4 * core * core;
    double second = hexagon ? 5 / (48 * Math.sqrt(3)) * Math.pow(core, 4) : area * core * core / 16;
    double seat = hexagon ? 2 / Math.sqrt(3) * core : core;
    double wrap = (diameter - seat) / 2;
    double turn = Math.hypot(Math.PI * (seat + wrap), wrap);
    double winding = luck.normal(plan.construction().wrapDensity(), 60) * Math.PI / 4 * wrap * turn;
    return new VirtualWire(STEEL * area + winding, modulus * area, modulus * second);
  }

  private VirtualWire nylon(StringPlan plan, double diameter, double scale) {
    boolean wound = plan.construction() == Construct.WOUND_NYLON;
    double speedOfTheTable = 2 * 0.65 * plan.hz();
    double mass =
        wound
            ? luck.normal(67, 3) / (speedOfTheTable * speedOfTheTable)
            : luck.normal(975, 25) * Math.PI / 4 * diameter * diameter;
    double speed = 2 * scale * plan.hz();
    double tension = mass * speed * speed;
    double stretch = wound ? luck.normal(50, 6) : luck.normal(53, 6);
    double bendingShare = wound ? luck.between(0.2, 0.6) : luck.normal(0.5, 0.03);
    double reach = bendingShare * Math.sqrt(stretch) * diameter / 2;
    return new VirtualWire(mass, stretch * tension, reach * reach * tension);
  }
}
