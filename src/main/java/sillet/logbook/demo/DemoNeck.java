package sillet.logbook.demo;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import sillet.acoustics.readings.Reference;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.HandOut;
import sillet.logbook.actions.LogWork;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.actions.WriteNote;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.strings.FittedString;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.WorkLine;

/**
 * Two invented visits of the Parlour, read along the whole neck. Its readings are those of a
 * reckoned instrument whose fret 9 stands 0.45 mm toward the bridge; at the first visit the slot of
 * string 5 is 0.45 mm high as well.
 */
final class DemoNeck {
  private static final int[] FRETS = {1, 2, 3, 5, 7, 9, 12, 15, 17};
  private static final double SD_CENTS = 0.3;
  private static final Instrument PARLOUR = DemoInstruments.PARLOUR;

  private static final List<String> BEFORE =
      List.of(
          "1.3 0.6 1.0 1.3 1.4 3.5 1.3 1.5 1.7",
          "2.4 1.8 2.3 2.2 2.5 5.5 3.3 3.9 4.1",
          "0.9 1.0 1.0 0.6 0.0 1.9 -0.7 -1.9 -2.4",
          "1.8 1.3 1.2 1.1 1.2 2.9 0.2 0.2 -0.7",
          "6.6 3.7 4.0 2.9 2.5 4.4 2.3 2.1 1.6",
          "3.3 2.6 2.3 2.0 1.4 3.8 1.3 0.5 -0.7");

  private static final List<String> AGAIN =
      List.of(
          "1.2 0.6 1.1 1.5 1.6 3.3 1.1 1.6 1.7",
          "2.4 1.7 1.3 2.3 2.5 5.6 3.2 3.3 4.1",
          "1.7 1.0 0.7 0.4 -0.2 1.7 -1.3 -1.7 -1.8",
          "1.4 0.4 1.7 1.0 0.2 3.2 -0.4 0.9 -0.5",
          "2.0 1.5 2.1 2.1 1.8 4.2 2.3 2.9 1.7",
          "3.6 2.7 1.9 2.3 2.0 4.1 1.1 0.4 -0.7");

  private DemoNeck() {}

  /** The first visit: a high slot is found and deepened. */
  static List<DemoAction> first(LocalDate day) {
    UUID id = DemoPeople.id("visit neck first");
    Instant at = DemoShop.morning(day);
    List<Action> actions = new ArrayList<>();
    actions.add(
        new TakeIn(
            visit(id, DemoShop.NECK_TICKET, day, "Open chords sound sour, worst on the fifth.")));
    actions.add(checks(id));
    actions.add(readings(id, at, BEFORE));
    actions.add(
        new LogWork(
            id, new WorkLine(at, DemoShop.TECHNICIAN, "Slot of string 5 deepened, read by ear")));
    actions.add(
        new WriteNote(
            id, new VisitNote(at, NoteKind.DECLINED, "Fret 9 stays as it is, I hardly play it.")));
    actions.add(new HandOut(id, day.plusDays(1)));
    return DemoVisits.told(actions, at);
  }

  /** The second: the slot is right now, the fret is still off, and another tuning is asked for. */
  static List<DemoAction> again(LocalDate day) {
    UUID id = DemoPeople.id("visit neck again");
    Instant at = DemoShop.morning(day);
    List<Action> actions = new ArrayList<>();
    actions.add(
        new TakeIn(
            visit(
                id,
                DemoShop.NECK_AGAIN_TICKET,
                day,
                "What would heavier strings a tone lower ask for?")));
    actions.add(checks(id));
    actions.add(readings(id, at, AGAIN));
    return DemoVisits.told(actions, at);
  }

  private static Visit visit(UUID id, int ticket, LocalDate day, String request) {
    List<FittedString> strings =
        DemoStrings.fitted(
            DemoStrings.ACOUSTIC_SIX, DemoStrings.SIX, PARLOUR.neck().scaleTrebleMm());
    StringsOn on =
        new StringsOn(
            DemoStrings.ACOUSTIC_SIX.name(), day.minusDays(9), "E A D G B E", 440, strings);
    List<Travel> room = new ArrayList<>();
    strings.forEach(string -> room.add(new Travel(string.number(), 1.4, 1.8)));
    Arrival arrival =
        new Arrival(day, DemoShop.TECHNICIAN, day.plusDays(9), request, "", 20.0, 44.0);
    return new Visit(id, ticket, PARLOUR.id(), PARLOUR.customerId(), arrival, on, room, null);
  }

  /** Outer strings measured, as it is usual. */
  private static RecordChecks checks(UUID id) {
    return new RecordChecks(
        id,
        List.of(
            check(CheckKind.RELIEF, 0, 8, CheckMethod.STRAIGHTEDGE, 0.2),
            check(CheckKind.ACTION, 1, 12, CheckMethod.OPEN, 1.8),
            check(CheckKind.ACTION, 6, 12, CheckMethod.OPEN, 2.3),
            check(CheckKind.FIRST_FRET_CLEARANCE, 1, 1, CheckMethod.OPEN, 0.42),
            check(CheckKind.FIRST_FRET_CLEARANCE, 6, 1, CheckMethod.OPEN, 0.56)));
  }

  private static BenchCheck check(
      CheckKind kind, int string, int fret, CheckMethod method, double mm) {
    return new BenchCheck(kind, string, fret, method, Moment.RECEIVED, mm, Double.toString(mm));
  }

  private static RecordReadings readings(UUID id, Instant at, List<String> rows) {
    List<Reading> readings = new ArrayList<>();
    for (int i = 0; i < rows.size(); i++) {
      String[] cents = rows.get(i).split(" ", -1);
      for (int j = 0; j < cents.length; j++) {
        Tries tries = Tries.parse(cents[j]);
        readings.add(new Reading(1, i + 1, FRETS[j], tries, Reference.OPEN, SD_CENTS, at));
      }
    }
    return new RecordReadings(id, readings);
  }
}
