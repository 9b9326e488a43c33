package sillet.desktop.visit.checks;

import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;

/** A length as the shop would type it, without its unit. */
final class InUnit {
  private InUnit() {}

  static String written(double mm, LengthUnit unit) {
    int decimals =
        switch (unit) {
          case MM -> 2;
          case INCH -> 3;
          case SIXTY_FOURTHS -> 1;
          case THOUSANDTHS -> 0;
        };
    return Figures.fixed(mm / unit.mm(), decimals);
  }
}
