package sillet.logbook.demo;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import sillet.acoustics.pitch.FretPositions;
import sillet.logbook.actions.RecordFretPlaces;
import sillet.logbook.actions.RecordPickups;
import sillet.logbook.parts.FretPlace;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.parts.Pickup;
import sillet.logbook.parts.PickupsMeasured;
import sillet.logbook.units.Figures;

/**
 * Invented frets and pickups of the Lapwing: its nut stands 0.4 mm too far, fret 7 a quarter of a
 * millimetre too near the bridge, and its pickups were lowered once.
 */
final class DemoParts {
  private static final double NUT_FAR_MM = 0.4;
  private static final int MISPLACED = 7;
  private static final double MISPLACED_MM = 0.25;

  /** What a rule adds, mm: invented, in fifths of a tenth. */
  private static final double[] RULE_MM = {
    0.02, -0.02, 0.0, 0.02, 0.0, -0.02, 0.0, 0.02, -0.02, 0.0
  };

  private DemoParts() {}

  /** Measured on the day of the first visit, the pickups a second time when it was handed out. */
  static List<DemoAction> lapwing(LocalDate day) {
    UUID id = DemoInstruments.LAPWING.id();
    Instant at = DemoShop.morning(day).plusSeconds(3 * 3600);
    Instant later = DemoShop.morning(day.plusDays(2)).plusSeconds(3600);
    String by = DemoShop.TECHNICIAN;
    return List.of(
        new DemoAction(at, by, new RecordFretPlaces(id, frets(at))),
        new DemoAction(at, by, new RecordPickups(id, pickups(at, 1.2, 1.6))),
        new DemoAction(later, by, new RecordPickups(id, pickups(later, 2.0, 2.4))));
  }

  private static FretPlaces frets(Instant at) {
    double scaleMm = DemoInstruments.LAPWING.neck().scaleTrebleMm();
    List<FretPlace> places = new ArrayList<>();
    for (int fret = 1; fret <= DemoInstruments.LAPWING.neck().frets(); fret++) {
      double exact = FretPositions.fromNut(scaleMm, fret) + NUT_FAR_MM;
      double error = fret == MISPLACED ? MISPLACED_MM : 0;
      String typed = Figures.fixed(exact + error + RULE_MM[fret % RULE_MM.length], 2);
      places.add(new FretPlace(fret, Double.parseDouble(typed), typed));
    }
    return new FretPlaces(at, scaleMm, places);
  }

  private static PickupsMeasured pickups(Instant at, double trebleMm, double bassMm) {
    return new PickupsMeasured(
        at,
        List.of(
            new Pickup("bridge", 41.5, trebleMm + 0.4, bassMm),
            new Pickup("middle", 98, trebleMm + 0.2, bassMm),
            new Pickup("neck", 162, trebleMm, bassMm)));
  }
}
