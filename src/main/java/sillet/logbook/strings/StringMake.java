package sillet.logbook.strings;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Figures;

/**
 * How one string is made.
 *
 * @param gaugeIn outer diameter, inches, above zero
 * @param construction plain or wound, and of what
 * @param coreIn core diameter, inches; null if not known
 * @param unitMassGPerM mass per length, grams per metre; null if not known
 */
public record StringMake(
    double gaugeIn,
    Construction construction,
    @Nullable Double coreIn,
    @Nullable Double unitMassGPerM) {

  /**
   * Refuses what no string can be.
   *
   * @throws Rejection if a figure is not above zero, or the core does not fit the gauge
   */
  public StringMake {
    aboveZero("string.gauge", gaugeIn);
    if (unitMassGPerM != null) {
      aboveZero("string.unit-mass", unitMassGPerM);
    }
    if (coreIn != null) {
      aboveZero("string.core", coreIn);
      boolean fits = ConstructionWords.wound(construction) ? coreIn < gaugeIn : coreIn == gaugeIn;
      if (!fits) {
        throw Rejection.of(
            ConstructionWords.wound(construction)
                ? "string.core-too-thick"
                : "string.core-of-plain",
            Figures.gauge(coreIn),
            Figures.gauge(gaugeIn));
      }
    }
  }

  private static void aboveZero(String key, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw Rejection.of(key, Double.toString(value));
    }
  }

  /**
   * A string of which only the packet is known.
   *
   * @param gaugeIn outer diameter, inches
   * @param construction plain or wound, and of what
   * @return core and unit mass not known
   */
  public static StringMake of(double gaugeIn, Construction construction) {
    return new StringMake(gaugeIn, construction, null, null);
  }
}
