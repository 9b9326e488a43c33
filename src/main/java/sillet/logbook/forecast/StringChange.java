package sillet.logbook.forecast;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.units.Pitch;

/**
 * What one string will be. Null pitch, gauge, construction or action is unchanged; null core or
 * unit mass is unchanged only where gauge and construction are, else estimated.
 *
 * @param string number
 * @param pitch what it will be tuned to
 * @param gaugeIn outer diameter, inches
 * @param construction how it will be made
 * @param coreIn core diameter, inches
 * @param unitMassGPerM mass per length, grams per metre
 * @param action12Mm gap over fret 12, millimetres
 */
public record StringChange(
    int string,
    @Nullable Pitch pitch,
    @Nullable Double gaugeIn,
    @Nullable Construction construction,
    @Nullable Double coreIn,
    @Nullable Double unitMassGPerM,
    @Nullable Double action12Mm) {

  /**
   * A string of which nothing changes.
   *
   * @param string number
   * @return the change that is none
   */
  public static StringChange none(int string) {
    return new StringChange(string, null, null, null, null, null, null);
  }
}
