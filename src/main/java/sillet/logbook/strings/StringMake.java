package sillet.logbook.strings;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;

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
