package sillet.logbook.forecast;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
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
   * The string that will be on the instrument.
   *
   * @param now the string that is on it
   * @return its make
   * @throws sillet.logbook.text.Rejection if no string can be so
   */
  public StringMake make(StringMake now) {
    double gauge = gaugeIn == null ? now.gaugeIn() : gaugeIn;
    Construction how = construction == null ? now.construction() : construction;
    boolean same = gauge == now.gaugeIn() && how == now.construction();
    Double core = coreIn == null && same ? now.coreIn() : coreIn;
    Double unitMass = unitMassGPerM == null && same ? now.unitMassGPerM() : unitMassGPerM;
    return new StringMake(gauge, how, core, unitMass);
  }

  /**
   * The string as it will be on the instrument, tuned.
   *
   * @param now the string that is on it
   * @return number and scale stay
   * @throws sillet.logbook.text.Rejection if no string can be so
   */
  public FittedString fitted(FittedString now) {
    return new FittedString(
        now.number(), pitch == null ? now.pitch() : pitch, now.scaleMm(), make(now.make()));
  }

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
