package sillet.desktop.pickups;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.parts.Pickup;
import sillet.logbook.parts.PickupsMeasured;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.VisitRecord;

/**
 * A line of the height log.
 *
 * @param day when it was measured
 * @param pickup its name; empty for a check of a visit, which names none
 * @param ticket of the visit whose check it is; 0 for one measured on this sheet
 * @param string of a check; 0 where the line has treble and bass
 * @param trebleMm gap on the treble side, or the one of a check
 * @param bassMm gap on the bass side
 */
record HeightRow(
    LocalDate day,
    String pickup,
    int ticket,
    int string,
    @Nullable Double trebleMm,
    @Nullable Double bassMm) {

  /** Everything known of the heights, the newest first. */
  static List<HeightRow> of(List<PickupsMeasured> measured, List<VisitRecord> visits, ZoneId zone) {
    List<HeightRow> rows = new ArrayList<>();
    for (PickupsMeasured one : measured) {
      LocalDate day = LocalDate.ofInstant(one.at(), zone);
      for (Pickup pickup : one.pickups()) {
        if (pickup.trebleMm() != null || pickup.bassMm() != null) {
          rows.add(new HeightRow(day, pickup.name(), 0, 0, pickup.trebleMm(), pickup.bassMm()));
        }
      }
    }
    for (VisitRecord visit : visits) {
      for (BenchCheck check : visit.checks()) {
        if (check.kind() == CheckKind.PICKUP_HEIGHT) {
          LocalDate day = visit.visit().arrival().takenIn();
          rows.add(
              new HeightRow(
                  day, "", visit.visit().ticket(), check.string(), check.valueMm(), null));
        }
      }
    }
    rows.sort(Comparator.comparing(HeightRow::day).reversed());
    return rows;
  }
}
