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

  /** The wire, how thick the core of a wound one is across the flats, and its make. */
  public record Drawn(VirtualWire wire, double core, StringMake make) {}

  Drawn draw(StringPlan plan, Kind kind, double scale) {
    return draw(plan, StringMake.draw(luck, plan, kind), scale);
  }

  private Drawn draw(StringPlan plan, StringMake make, double scale) {
    double diameter = plan.diameter() * luck.normal(1, 0.003);
    if (plan.construction().nylon()) {
      return new Drawn(nylon(plan, diameter, make, scale), diameter, make);
    }
    if (plan.construction() == Construct.PLAIN_STEEL) {
      double area = Math.PI / 4 * diameter * diameter;
      double second = area * diameter * diameter / 16;
      double density = luck.normal(STEEL, 25);
      VirtualWire wire =
          new VirtualWire(density * area, make.modulus() * area, make.modulus() * second);
      return new Drawn(wire, diameter, make);
    }
    double core = Math.min(diameter * plan.coreShare() * make.core(), 0.8 * diameter);
    return new Drawn(wound(plan, diameter, core, make), core, make);
  }

  /**
   * The string of another set, tuned to another pitch. Nylon is softer under less stress: modulus
   * 4.5 + 39 s GPa, s the stress in GPa (J. Woodhouse, N. Lynch-Aird, Acta Acustica united with
   * Acustica 105, 516 (2019), as quoted elsewhere); the filaments of a wound one carry about 0.15
   * GPa (assumed).
   */
  Drawn redraw(StringPlan usual, StringPlan tuned, StringMake make, double scale) {
    StringPlan fresh =
        new StringPlan(usual.hz(), tuned.gauge(), usual.construction(), usual.coreShare());
    Drawn drawn = draw(fresh, make, scale);
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
        drawn.core(),
        make);
  }

  private VirtualWire wound(StringPlan plan, double diameter, double core, StringMake make) {
    boolean hexagon = make.hexagon();
    double area = hexagon ? Math.sqrt(3) / 2 * core * core : Math.PI / 4 * core * core;
    double second = hexagon ? 5 / (48 * Math.sqrt(3)) * Math.pow(core, 4) : area * core * core / 16;
    double seat = hexagon ? 2 / Math.sqrt(3) * core : core;
    double wrap = (diameter - seat) / 2;
    double turn = Math.hypot(Math.PI * (seat + wrap), wrap);
    double winding = luck.normal(plan.construction().wrapDensity(), 60) * Math.PI / 4 * wrap * turn;
    return new VirtualWire(STEEL * area + winding, make.modulus() * area, make.modulus() * second);
  }

  private VirtualWire nylon(StringPlan plan, double diameter, StringMake make, double scale) {
    boolean wound = plan.construction() == Construct.WOUND_NYLON;
    double speedOfTheTable = 2 * 0.65 * plan.hz();
    double mass =
        wound
            ? luck.normal(67, 3) / (speedOfTheTable * speedOfTheTable)
            : luck.normal(975, 25) * Math.PI / 4 * diameter * diameter;
    double speed = 2 * scale * plan.hz();
    double tension = mass * speed * speed;
    double reach = make.bending() * Math.sqrt(make.stretch()) * diameter / 2;
    return new VirtualWire(mass, make.stretch() * tension, reach * reach * tension);
  }
}
