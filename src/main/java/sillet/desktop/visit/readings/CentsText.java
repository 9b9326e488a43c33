package sillet.desktop.visit.readings;

import sillet.logbook.units.Figures;

/** Cents as they stand on the visit page. */
public final class CentsText {
  private static final int DECIMALS = 1;

  private CentsText() {}

  /** One decimal, always with a sign but for zero. */
  public static String of(double cents) {
    return Figures.signed(cents, DECIMALS);
  }
}
