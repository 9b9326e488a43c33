package sillet.acoustics.wire;

/**
 * Cross-section of the core of a wound string, measured by its thickness: the diameter of a round
 * core, the distance across flats of a hexagonal one.
 *
 * <p>Hexagon of thickness s: area (sqrt 3 / 2) s^2 = 0.8660 s^2, second moment (5 / (48 sqrt 3))
 * s^4 = 0.06014 s^4, corner to corner 2 / sqrt 3 = 1.1547 s (plane geometry). The winding rides on
 * the corners.
 */
public enum CoreShape {
  /** Round core. */
  ROUND(Math.PI / 4, Math.PI / 64, 1),
  /** Hexagonal core. */
  HEX(Math.sqrt(3) / 2, 5 / (48 * Math.sqrt(3)), 2 / Math.sqrt(3));

  private final double areaFactor;
  private final double momentFactor;
  private final double cornerFactor;

  CoreShape(double areaFactor, double momentFactor, double cornerFactor) {
    this.areaFactor = areaFactor;
    this.momentFactor = momentFactor;
    this.cornerFactor = cornerFactor;
  }

  /** Area in m2 of a core of {@code thickness} in m. */
  public double area(double thickness) {
    return areaFactor * thickness * thickness;
  }

  /** Second moment of area in m4. */
  public double secondMoment(double thickness) {
    return momentFactor * Math.pow(thickness, 4);
  }

  /** Diameter in m of the circle that the winding rides on. */
  public double windingSeat(double thickness) {
    return cornerFactor * thickness;
  }
}
