package sillet.acoustics.wire;

/**
 * Unit mass and stiffness of a string from what its packet says.
 *
 * <p>Plain, of diameter d: area A = pi d^2 / 4, mass density x A, axial stiffness E A, bending
 * stiffness E pi d^4 / 64. Wound, with core d in an outer diameter D: only the core stretches and
 * bends (H. Fletcher, J. Acoust. Soc. Am. 36, 203 (1964) and J. A. Kemp, SN Applied Sciences 2, 636
 * (2020), both as cited by M. B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683
 * (2024)); a close winding of round wire fills pi / 4 of the ring between the core's corners and D
 * (plane geometry). A known unit mass or core is used instead of the estimate.
 *
 * <p>Spread of the axial stiffness: plain steel 3 % (modulus 190 to 207 GPa, and a micrometer's
 * error); a known core 4 %; an estimated core twice the spread of its share ({@link CoreShare});
 * polymers and gut 20 % ({@link Material}, {@link WoundNylon}).
 */
public final class StringEstimate {

  private static final double PLAIN_STEEL_SD = 0.03;
  private static final double KNOWN_CORE_SD = 0.04;
  private static final double SOFT_SD = 0.20;
  private static final double WEIGHED_SD = 0.01;

  /** Share of the ring that a close winding of round wire fills. */
  private static final double WINDING_FILL = Math.PI / 4;

  private StringEstimate() {}

  /**
   * The constants of a string.
   *
   * @param spec what is known of it
   * @param openHz pitch of the open string in Hz, above zero; polymers are stiffer at higher stress
   * @param scale nominal scale in m, above zero
   * @throws IllegalArgumentException where pitch or scale is not finite and above zero
   */
  public static StringConstants of(StringSpec spec, double openHz, double scale) {
    requirePositive("pitch", openHz);
    requirePositive("scale", scale);
    if (spec.construction() == Construction.WOUND_NYLON) {
      return WoundNylon.estimate(
          spec, openHz, scale, SOFT_SD, new WireSpread(0, 0.15, 0.6, mass(spec, 0.04)));
    }
    return spec.construction().wound() ? wound(spec, scale) : plain(spec, openHz, scale);
  }

  private static StringConstants plain(StringSpec spec, double openHz, double scale) {
    Material material = spec.construction().carrier();
    double area = CoreShape.ROUND.area(spec.diameter());
    Double given = spec.unitMass();
    double unitMass = given != null ? given : material.density() * area;
    double speed = 2 * scale * openHz;
    double modulus = material.modulus(unitMass * speed * speed / area);
    return new StringConstants(
        unitMass,
        modulus * area,
        modulus * CoreShape.ROUND.secondMoment(spec.diameter()),
        spec.construction().steel() ? PLAIN_STEEL_SD : SOFT_SD,
        spec.construction().steel()
            ? new WireSpread(0, PLAIN_STEEL_SD, 0.01, mass(spec, 0.01))
            : new WireSpread(0, 0.15, 0.06, mass(spec, 0.04)));
  }

  private static StringConstants wound(StringSpec spec, double scale) {
    Material steel = spec.construction().carrier();
    CoreShape shape = spec.coreShape();
    Double given = spec.core();
    CoreShare usual = CoreShare.usual(spec.diameter(), scale);
    double core = given != null ? given : usual.share() * spec.diameter();
    double sd = given != null ? KNOWN_CORE_SD : Math.hypot(2 * usual.relativeSd(), PLAIN_STEEL_SD);
    double area = shape.area(core);
    double modulus = steel.modulus(0);
    Double mass = spec.unitMass();
    double unitMass = mass != null ? mass : steel.density() * area + windingMass(spec, core);
    WireSpread spread =
        given != null
            ? new WireSpread(0.01, KNOWN_CORE_SD, 0.08, mass(spec, 0.02))
            : new WireSpread(usual.relativeSd(), KNOWN_CORE_SD, 0.08, mass(spec, 0.03));
    return new StringConstants(
        unitMass, modulus * area, modulus * shape.secondMoment(core), sd, spread);
  }

  private static double mass(StringSpec spec, double estimated) {
    return spec.unitMass() == null ? estimated : WEIGHED_SD;
  }

  private static double windingMass(StringSpec spec, double core) {
    Material wrap = spec.construction().wrap().orElseThrow();
    double seat = spec.coreShape().windingSeat(core);
    double ring = CoreShape.ROUND.area(spec.diameter()) - CoreShape.ROUND.area(seat);
    return WINDING_FILL * wrap.density() * ring;
  }

  private static void requirePositive(String what, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must be above zero, is " + value);
    }
  }
}
