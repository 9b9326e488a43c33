package sillet.acoustics.virtual;

/**
 * What a string really is.
 *
 * @param slackMass unit mass without tension, kg/m
 * @param axial EA, N
 * @param bending EI, N m2
 */
public record VirtualWire(double slackMass, double axial, double bending) {
  /** Unit mass once the string is stretched. */
  public double unitMass(double tension) {
    return slackMass / (1 + tension / axial);
  }
}
