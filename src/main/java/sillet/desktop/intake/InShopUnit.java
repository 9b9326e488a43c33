package sillet.desktop.intake;

import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;

/** A known length as the shop would type it: without a unit where that is millimetres. */
final class InShopUnit {
  private InShopUnit() {}

  static String written(double mm, LengthUnit unit) {
    if (unit == LengthUnit.MM) {
      return trimmed(Figures.fixed(mm, 2));
    }
    return trimmed(Figures.fixed(mm / LengthUnit.MM_PER_INCH, 3)) + " in";
  }

  private static String trimmed(String figure) {
    return figure.replaceFirst("\\.?0+$", "");
  }
}
