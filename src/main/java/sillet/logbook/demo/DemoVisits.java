package sillet.logbook.demo;

import java.time.Duration;
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
import sillet.logbook.actions.RecordMoves;
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
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.WorkLine;

/** Invented visits: one finished and proved, one read once, one just arrived. */
final class DemoVisits {
  private static final double TENTH_TUNER_SD_CENTS = 0.3;
  private static final double TRAVEL_BACK_MM = 6.5;
  private static final double TRAVEL_FORWARD_MM = 2.5;

  private DemoVisits() {}

  /** The Lapwing's first setup: read, moved, read again, handed out. */
  static List<DemoAction> finished(LocalDate day) {
    UUID id = DemoPeople.id("visit finished");
    Instant at = DemoShop.morning(day);
    Arrival arrival =
        new Arrival(
            day,
            DemoShop.TECHNICIAN,
            day.plusDays(3),
            "First check over, please.",
            "Clean, light wear at frets 1 to 3",
            20.5,
            47.0);
    List<Action> actions = new ArrayList<>();
    actions.add(new TakeIn(visit(id, DemoShop.FINISHED_TICKET, arrival, lapwingStrings(day))));
    actions.add(checks(id, Moment.RECEIVED, new double[] {0.28, 1.7, 2.1, 0.42, 0.55}));
    actions.add(readings(id, 1, at, "3.9", "2.7", "6.1/6.4/6.2", "0.4", "1.8", "-1.9"));
    actions.add(
        new RecordMoves(
            id,
            List.of(
                move(1, at, 1.45),
                move(2, at, 1.00),
                move(3, at, 2.29),
                move(5, at, 0.66),
                move(6, at, -0.70))));
    actions.add(readings(id, 2, at, "0.2", "-0.1", "0.4/0.2/0.3", "0.4", "0.1", "-0.3"));
    actions.add(checks(id, Moment.LEFT, new double[] {0.22, 1.6, 2.0, 0.42, 0.55}));
    actions.add(
        new LogWork(
            id, new WorkLine(at, DemoShop.TECHNICIAN, "Saddles moved, frets wiped, board oiled")));
    actions.add(
        new WriteNote(
            id, new VisitNote(at, NoteKind.ADVICE, "Keep the case between 40 and 55 % humidity.")));
    actions.add(new HandOut(id, day.plusDays(2)));
    return told(actions, at);
  }

  /** The Lapwing comes back: strings fitted, read once, moves not yet made. */
  static List<DemoAction> open(LocalDate day) {
    UUID id = DemoPeople.id("visit open");
    Instant at = DemoShop.morning(day);
    Arrival arrival =
        new Arrival(
            day,
            DemoShop.TECHNICIAN,
            day.plusDays(3),
            "Sour past the seventh fret. Strings are a week old.",
            "As last time",
            19.0,
            36.0);
    List<Action> actions = new ArrayList<>();
    actions.add(
        new TakeIn(visit(id, DemoShop.OPEN_TICKET, arrival, lapwingStrings(day.minusDays(7)))));
    actions.add(checks(id, Moment.RECEIVED, new double[] {0.31, 1.6, 2.1, 0.42, 0.56}));
    actions.add(readings(id, 1, at, "4.9/5.0/5.2", "3.2", "7.7/7.8/8.0", "0.3", "2.1", "-2.6"));
    actions.add(alongTheNeck(id, at));
    return told(actions, at);
  }

  /** The bass stands in its case, nothing done yet. */
  static List<DemoAction> arrived(LocalDate day) {
    Instrument bass = DemoInstruments.TRAWLER;
    Arrival arrival =
        new Arrival(day, "Bram (demo)", day.plusDays(5), "New set, check over.", "", null, null);
    List<FittedString> strings =
        DemoStrings.fitted(DemoStrings.LONG_FOUR, DemoStrings.FOUR, bass.neck().scaleTrebleMm());
    StringsOn on = new StringsOn(DemoStrings.LONG_FOUR.name(), null, "E A D G", 440, strings);
    Visit visit =
        new Visit(
            DemoPeople.id("visit arrived"),
            DemoShop.OPEN_TICKET + 1,
            bass.id(),
            bass.customerId(),
            arrival,
            on,
            List.of(),
            null);
    return told(List.of(new TakeIn(visit)), DemoShop.morning(day));
  }

  static List<DemoAction> told(List<Action> actions, Instant at) {
    List<DemoAction> story = new ArrayList<>();
    Instant time = at;
    for (Action action : actions) {
      story.add(new DemoAction(time, DemoShop.TECHNICIAN, action));
      time = time.plus(Duration.ofMinutes(6));
    }
    return story;
  }

  private static StringsOn lapwingStrings(LocalDate fitted) {
    List<FittedString> strings =
        DemoStrings.fitted(
            DemoStrings.LIGHT_SIX, DemoStrings.SIX, DemoInstruments.LAPWING.neck().scaleTrebleMm());
    return new StringsOn(
        DemoStrings.LIGHT_SIX.name(), fitted, DemoStrings.SIX.name(), 440, strings);
  }

  private static Visit visit(UUID id, int ticket, Arrival arrival, StringsOn strings) {
    Instrument instrument = DemoInstruments.LAPWING;
    List<Travel> travel = new ArrayList<>();
    for (FittedString string : strings.strings()) {
      travel.add(new Travel(string.number(), TRAVEL_BACK_MM, TRAVEL_FORWARD_MM));
    }
    return new Visit(
        id, ticket, instrument.id(), instrument.customerId(), arrival, strings, travel, null);
  }

  /** Relief, action of strings 1 and 6, first-fret clearance of strings 1 and 6, in that order. */
  private static RecordChecks checks(UUID id, Moment moment, double[] mm) {
    return new RecordChecks(
        id,
        List.of(
            check(CheckKind.RELIEF, 0, 8, moment, mm[0]),
            check(CheckKind.ACTION, 1, 12, moment, mm[1]),
            check(CheckKind.ACTION, 6, 12, moment, mm[2]),
            check(CheckKind.FIRST_FRET_CLEARANCE, 1, 1, moment, mm[3]),
            check(CheckKind.FIRST_FRET_CLEARANCE, 6, 1, moment, mm[4])));
  }

  private static BenchCheck check(CheckKind kind, int string, int fret, Moment moment, double mm) {
    CheckMethod method = kind == CheckKind.RELIEF ? CheckMethod.STRAIGHTEDGE : CheckMethod.OPEN;
    return new BenchCheck(kind, string, fret, method, moment, mm, Double.toString(mm));
  }

  /** The slot of string 2 is high and fret 7 stands a little toward the bridge. */
  private static RecordReadings alongTheNeck(UUID id, Instant at) {
    List<Reading> readings = new ArrayList<>();
    readings.addAll(at(1, at, "0.6", "7.4", "0.9", "0.4", "0.3", "0.1"));
    readings.addAll(at(2, at, "0.9", "5.1", "1.2", "0.5", "0.5", "0.0"));
    readings.addAll(at(3, at, "1.2", "4.0", "1.8", "0.4", "0.8", "-0.2"));
    readings.addAll(at(5, at, "1.8", "3.0", "2.9", "0.3", "1.0", "-0.7"));
    readings.addAll(at(7, at, "5.2", "5.1", "6.9", "3.0", "4.2", "1.6"));
    readings.addAll(at(9, at, "3.4", "2.6", "5.4", "0.3", "1.6", "-1.6"));
    readings.addAll(at(15, at, "6.9", "4.2", "10.3", "0.4", "2.9", "-3.5"));
    readings.addAll(at(17, at, "8.4", "4.8", "12.6", "0.5", "3.4", "-4.2"));
    return new RecordReadings(id, readings);
  }

  private static List<Reading> at(int fret, Instant at, String... cents) {
    List<Reading> readings = new ArrayList<>();
    for (int i = 0; i < cents.length; i++) {
      Tries tries = Tries.parse(cents[i]);
      readings.add(new Reading(1, i + 1, fret, tries, Reference.OPEN, TENTH_TUNER_SD_CENTS, at));
    }
    return readings;
  }

  private static RecordReadings readings(UUID id, int pass, Instant at, String... cents12) {
    List<Reading> readings = new ArrayList<>();
    for (int i = 0; i < cents12.length; i++) {
      Tries tries = Tries.parse(cents12[i]);
      readings.add(new Reading(pass, i + 1, 12, tries, Reference.OPEN, TENTH_TUNER_SD_CENTS, at));
    }
    return new RecordReadings(id, readings);
  }

  private static MadeMove move(int string, Instant at, double mm) {
    return new MadeMove(1, string, mm, Math.abs(mm) / 0.5, null, at);
  }
}
