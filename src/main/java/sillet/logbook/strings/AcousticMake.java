package sillet.logbook.strings;

import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.wire.CoreShape;
import sillet.acoustics.wire.StringSpec;
import sillet.logbook.units.LengthUnit;

/** How a string is made, as the physics takes it: inches and grams into metres and kilograms. */
public final class AcousticMake {
  private static final double M_PER_MM = 1e-3;
  private static final double M_PER_INCH = LengthUnit.MM_PER_INCH * M_PER_MM;
  private static final double KG_PER_G = 1e-3;

  private AcousticMake() {}

  /**
   * The string by itself.
   *
   * @param make gauge in inches, unit mass in grams per metre
   * @return the same in SI units; the core of a plain string, which is the string, is left out
   */
  public static StringSpec spec(StringMake make) {
    Double core = ConstructionWords.wound(make.construction()) ? make.coreIn() : null;
    Double mass = make.unitMassGPerM();
    return new StringSpec(
        make.gaugeIn() * M_PER_INCH,
        make.construction(),
        CoreShape.ROUND,
        core == null ? null : core * M_PER_INCH,
        mass == null ? null : mass * KG_PER_G);
  }

  /**
   * The string on its instrument.
   *
   * @param string pitch in hertz, scale in millimetres above zero
   * @return the same in SI units
   */
  public static Stringing stringing(FittedString string) {
    return new Stringing(spec(string.make()), string.pitch().hz(), string.scaleMm() * M_PER_MM);
  }
}
