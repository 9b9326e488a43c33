package sillet.acoustics.virtual;

/**
 * One string of a set as its packet names it.
 *
 * @param hz pitch it is tuned to
 * @param gauge diameter in inches
 * @param construction word of the packet
 * @param coreShare usual share of the core in the diameter, 1 for a plain string
 */
public record StringPlan(double hz, double gauge, Construct construction, double coreShare) {
  /** How a string is built, and of what. */
  public enum Construct {
    PLAIN_STEEL(0),
    WOUND_STEEL(7870),
    WOUND_NICKEL(8900),
    WOUND_BRONZE(8800),
    PLAIN_NYLON(0),
    WOUND_NYLON(0);

    private final double wrapDensity;

    Construct(double wrapDensity) {
      this.wrapDensity = wrapDensity;
    }

    /** kg/m3; 0 where nothing is wrapped around steel. */
    double wrapDensity() {
      return wrapDensity;
    }

    public boolean woundOnSteel() {
      return wrapDensity > 0;
    }

    public boolean nylon() {
      return this == PLAIN_NYLON || this == WOUND_NYLON;
    }
  }

  /** Scientific pitch by semitones from A4 at 440 Hz. */
  static StringPlan of(int semitones, double gauge, Construct construction, double coreShare) {
    return new StringPlan(440 * Math.pow(2, semitones / 12.0), gauge, construction, coreShare);
  }

  /** The same place in another set: gauge times a factor, to half a thousandth, tuned lower. */
  StringPlan changed(double gaugeFactor, int semitonesLower) {
    double lower = hz * Math.pow(2, -semitonesLower / 12.0);
    return new StringPlan(
        lower, Math.rint(gauge * gaugeFactor * 2000) / 2000, construction, coreShare);
  }

  public double diameter() {
    return gauge * 0.0254;
  }
}
