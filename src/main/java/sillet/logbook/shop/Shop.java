package sillet.logbook.shop;

import java.util.List;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/**
 * The shop's own settings, as they enter every calculation.
 *
 * @param name what it is called
 * @param lengthUnit the unit people type without a suffix
 * @param referenceHz what A4 is here, hertz
 * @param breakingSharePercent beyond this share of its breaking tension a string is flagged; 75 as
 *     shipped, common practice, no source
 * @param technicians who works here, at least one name
 * @param demo true for the invented demo shop, which is marked wherever it shows
 */
public record Shop(
    String name,
    LengthUnit lengthUnit,
    double referenceHz,
    double breakingSharePercent,
    List<String> technicians,
    boolean demo) {
  /** As shipped: three quarters of the breaking tension (common practice, no source). */
  public static final double USUAL_BREAKING_SHARE_PERCENT = 75;

  /** Copies the names. */
  public Shop {
    technicians = List.copyOf(technicians);
  }

  /**
   * A shop with the usual settings.
   *
   * @param name what it is called
   * @param technicians who works here
   * @return millimetres, A4 at 440 Hz, three quarters of the breaking tension
   */
  public static Shop usual(String name, List<String> technicians) {
    return new Shop(
        name, LengthUnit.MM, Pitch.CONCERT_A4_HZ, USUAL_BREAKING_SHARE_PERCENT, technicians, false);
  }
}
