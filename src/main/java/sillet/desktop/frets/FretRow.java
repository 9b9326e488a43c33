package sillet.desktop.frets;

import java.util.Optional;

/**
 * One line of the sheet.
 *
 * @param fret its number
 * @param fromNutMm where it belongs, from the nut
 * @param fromBeforeMm from the fret before, or the nut
 * @param toLastMm to the last fret
 * @param off how far it was measured from where it belongs; empty where it was not measured
 */
record FretRow(
    int fret, double fromNutMm, double fromBeforeMm, double toLastMm, Optional<Off> off) {

  /**
   * The difference.
   *
   * @param mm positive is too near to the bridge
   * @param cents what that does to its notes; positive is sharp
   */
  record Off(double mm, double cents) {}
}
