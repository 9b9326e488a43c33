package sillet.desktop.visit.checks;

import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;

/**
 * What a row of checks is about before fret and method are said.
 *
 * @param kind what is measured
 * @param string number, 0 for the whole neck
 */
record CheckPlace(CheckKind kind, int string) {
  private static final int OCTAVE_FRET = 12;

  /** A fret in the middle of the neck (common practice, no source). */
  private static final int RELIEF_FRET = 8;

  static CheckPlace of(BenchCheck check) {
    return new CheckPlace(check.kind(), check.string());
  }

  /** Where it is usually measured (common practice, no source); 0 where no fret is meant. */
  int usualFret() {
    return switch (kind) {
      case RELIEF -> RELIEF_FRET;
      case ACTION -> OCTAVE_FRET;
      case FIRST_FRET_CLEARANCE -> 1;
      case PICKUP_HEIGHT, SADDLE_HEIGHT -> 0;
    };
  }

  /** How it is usually measured (common practice, no source). */
  CheckMethod usualMethod() {
    return switch (kind) {
      case RELIEF -> CheckMethod.STRAIGHTEDGE;
      case ACTION, FIRST_FRET_CLEARANCE, SADDLE_HEIGHT -> CheckMethod.OPEN;
      case PICKUP_HEIGHT -> CheckMethod.PRESSED_LAST;
    };
  }

  /** True where the fret is a choice. */
  boolean fretChosen() {
    return kind == CheckKind.RELIEF || kind == CheckKind.ACTION;
  }
}
