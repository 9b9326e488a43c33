package sillet.acoustics.wire;

/**
 * What strings and their windings are made of: Young's modulus and density.
 *
 * <p>For polymers the modulus grows with the stress the string stands under, so it is a line, base
 * + slope x stress. The two polymer lines and densities are least-squares fits to table 1.1 of M.
 * B. Anderson, R. G. Beausoleil, J. Acoust. Soc. Am. 156(1), 683 (2024) (modulus at pitch from a
 * slow stretch test), with the diameter printed on the packet; they give each string's own figure
 * within 10 % for nylon of normal to extra hard tension and 7 % for fluorocarbon. The same table's
 * light nylon set is 1.6 to 1.9 times stiffer. J. Woodhouse, N. Lynch-Aird, Acta Acustica united
 * with Acustica 105, 516 (2019) find the same slopes (39 and 41) over a higher base (4.5 and 3.2
 * GPa) with a faster test; the slow test is used here because fretting is slow.
 */
public enum Material {
  /** Music wire: EN 10270-1, E 206 GPa. References range from 190 to 207 GPa. */
  MUSIC_WIRE(206e9, 0, 7850),

  /** Plated or stainless steel wrap; density 7850 to 7900, from memory. */
  STEEL_WRAP(200e9, 0, 7850),

  /** Pure nickel wrap: university data sheet. */
  NICKEL(200e9, 0, 8900),

  /** Phosphor bronze C51000: materials database; 80/20 copper-zinc has 8500 to 8670. */
  BRONZE(110e9, 0, 8800),

  /** Nylon treble string at pitch, by the diameter on the packet; E 3.8 to 9.1 GPa in use. */
  NYLON(0.92e9, 44.2, 972),

  /** Fluorocarbon treble string at pitch; E 5.5 to 13.4 GPa in use. */
  FLUOROCARBON(1.53e9, 40.0, 1610),

  /** Gut: E 5 to 6 GPa independent of stress, 1300 kg/m3, from memory. */
  GUT(5.5e9, 0, 1300);

  private final double base;
  private final double slope;
  private final double density;

  Material(double base, double slope, double density) {
    this.base = base;
    this.slope = slope;
    this.density = density;
  }

  /** Young's modulus in Pa under {@code stress} in Pa; stress matters for polymers only. */
  public double modulus(double stress) {
    return base + slope * stress;
  }

  /** Density in kg/m3. */
  public double density() {
    return density;
  }
}
