package sillet.store;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.UUID;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.ChooseAim;
import sillet.logbook.actions.ForgetLearned;
import sillet.logbook.actions.HandOut;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.LogWork;
import sillet.logbook.actions.NameShop;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.actions.RecordFretPlaces;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.actions.RecordPickups;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.RecordTravel;
import sillet.logbook.actions.ReviseCustomer;
import sillet.logbook.actions.ReviseInstrument;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.actions.WriteNote;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.parts.FretPlace;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.parts.Pickup;
import sillet.logbook.parts.PickupsMeasured;
import sillet.logbook.shop.Customer;
import sillet.logbook.shop.Shop;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;
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
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.WorkLine;

/** A day in an invented shop that does every action once or more; all of it is made up. */
public final class BenchDay {
  public static final String TECHNICIAN = "Ada Quill";
  public static final UUID CUSTOMER_ID = id(1);
  public static final UUID INSTRUMENT_ID = id(2);
  public static final UUID SHORT_FIFTH_ID = id(3);
  public static final UUID SET_ID = id(4);
  public static final UUID VISIT_ID = id(5);
  public static final UUID SECOND_VISIT_ID = id(6);
  public static final int TICKET = 1041;
  public static final LocalDate DAY = LocalDate.of(2025, 3, 30);
  public static final Instant AT = Instant.parse("2025-03-30T01:30:00.123456Z");

  private BenchDay() {}

  public static UUID id(int number) {
    return new UUID(0x5111e7L, number);
  }

  public static Shop shop() {
    return new Shop(
        "Quill & Sons \u2013 demo",
        LengthUnit.SIXTY_FOURTHS,
        442,
        75,
        List.of("Ada Quill", "B. Rook"),
        true);
  }

  public static Customer customer() {
    return new Customer(
        CUSTOMER_ID,
        "Zo\u00eb Mar\u0161\u00e1lek",
        "0151 / 234-567",
        "zoe@example.org",
        "rings twice");
  }

  public static Instrument instrument() {
    return new Instrument(
        INSTRUMENT_ID,
        CUSTOMER_ID,
        InstrumentKind.ELECTRIC,
        "Alderton",
        "Meadow 6",
        "A-0042",
        "blue tag 7",
        new Neck(6, 628.65, 647.7, 22, 304.8, true),
        new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.CLOCKWISE_AWAY, null));
  }

  /** Five strings, the fifth of them short and with a nut of its own. */
  public static Instrument shortFifth() {
    return new Instrument(
        SHORT_FIFTH_ID,
        null,
        InstrumentKind.BANJO,
        "",
        "five-string",
        "",
        "",
        new Neck(5, 669.9, 669.9, 22, null, false),
        new Saddle(SaddleKind.FLOATING, null, ScrewSense.NOT_KNOWN, null));
  }

  public static StringSet set() {
    return new StringSet(
        SET_ID,
        "Light demo 10-46",
        List.of(
            StringMake.of(.010, Construction.PLAIN_STEEL),
            new StringMake(.046, Construction.WOUND_NICKEL, .018, 6.4)));
  }

  public static Visit visit() {
    return new Visit(
        VISIT_ID,
        TICKET,
        INSTRUMENT_ID,
        CUSTOMER_ID,
        new Arrival(DAY, TECHNICIAN, DAY.plusDays(7), "sharp up the neck", "dusty", 20.5, 45.0),
        new StringsOn(
            "Light demo 10-46",
            DAY.minusDays(90),
            "Drop D",
            442,
            List.of(
                new FittedString(
                    1,
                    Pitch.parse("E4", 442).shifted(-2),
                    628.65,
                    StringMake.of(.010, Construction.PLAIN_STEEL)),
                new FittedString(
                    6,
                    Pitch.parse("D2", 442),
                    647.7,
                    new StringMake(.046, Construction.WOUND_NICKEL, .018, 6.4)))),
        List.of(new Travel(1, 3.5, null), new Travel(6, null, 0.25)),
        null);
  }

  public static Visit secondVisit() {
    return new Visit(
        SECOND_VISIT_ID,
        TICKET + 1,
        SHORT_FIFTH_ID,
        null,
        new Arrival(DAY.plusDays(1), "B. Rook", null, "", "", null, null),
        new StringsOn(
            "",
            null,
            "",
            440,
            List.of(
                new FittedString(
                    5,
                    Pitch.parse("G4", 440),
                    502.0,
                    StringMake.of(.009, Construction.PLAIN_STEEL)))),
        List.of(),
        null);
  }

  public static List<BenchCheck> checks() {
    return List.of(
        new BenchCheck(
            CheckKind.RELIEF, 0, 7, CheckMethod.STRAIGHTEDGE, Moment.RECEIVED, 0.25, ".010in"),
        new BenchCheck(
            CheckKind.ACTION, 6, 12, CheckMethod.OPEN, Moment.RECEIVED, 2.38125, "6/64"));
  }

  public static List<Reading> readings() {
    return List.of(
        new Reading(1, 1, 12, Tries.parse("3.1/2.8/3.3"), Reference.OPEN, 0.5, AT),
        new Reading(1, 1, 5, Tries.parse("5"), Reference.HARMONIC, 0.1, AT.plusSeconds(20)),
        new Reading(1, 6, 12, Tries.parse("5.0"), Reference.OPEN, 0.5, AT.plusSeconds(40)),
        new Reading(1, 6, 12, null, Reference.OPEN, 0.5, AT.plusSeconds(60)));
  }

  public static List<MadeMove> moves() {
    return List.of(
        new MadeMove(1, 1, 1.86, 3.72, null, AT.plusSeconds(100)),
        new MadeMove(1, 6, -0.4, null, 0.05, AT.plusSeconds(120)));
  }

  public static WorkLine work() {
    return new WorkLine(AT.plusSeconds(200), "B. Rook", "frets 1-3 polished");
  }

  public static VisitNote note() {
    return new VisitNote(AT.plusSeconds(300), NoteKind.DECLINED, "\u201cno new nut, please\u201d");
  }

  public static FretPlaces fretPlaces() {
    return new FretPlaces(
        AT.plusSeconds(400),
        647.7,
        List.of(new FretPlace(1, 36.4, "36.4"), new FretPlace(12, 323.85, "12.75in")));
  }

  public static PickupsMeasured pickups() {
    return new PickupsMeasured(
        AT.plusSeconds(500),
        List.of(new Pickup("bridge", 41.5, 1.6, 2.0), new Pickup("neck", 162.25, null, null)));
  }

  public static VisitAim aim() {
    return new VisitAim(AimChoice.parse("1 5 7 12:2.5"), NutMovable.WHOLE);
  }

  /** Every action, in an order that works in an empty logbook. */
  public static List<Action> actions() {
    Customer renamed = new Customer(CUSTOMER_ID, "Zo\u00eb Marsh", "0151 234567", "", "");
    Instrument sold =
        new Instrument(
            INSTRUMENT_ID,
            null,
            InstrumentKind.ELECTRIC,
            "Alderton",
            "Meadow 6",
            "A-0042",
            "blue tag 7",
            new Neck(6, 628.65, 647.7, 22, null, true),
            new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.CLOCKWISE_TOWARD, null));
    return List.of(
        new NameShop(shop()),
        new NameShop(Shop.usual("Quill & Sons", List.of("Ada Quill"))),
        new AddCustomer(customer()),
        new AddInstrument(instrument()),
        new AddInstrument(shortFifth()),
        new KeepStringSet(new StringSet(SET_ID, "first name", set().strings().subList(0, 1))),
        new KeepStringSet(set()),
        new TakeIn(visit()),
        new RecordChecks(VISIT_ID, checks()),
        new RecordReadings(VISIT_ID, readings()),
        new RecordMoves(VISIT_ID, moves()),
        new LogWork(VISIT_ID, work()),
        new WriteNote(VISIT_ID, note()),
        new TakeIn(secondVisit()),
        new ReviseCustomer(renamed, 1),
        new RecordTravel(VISIT_ID, List.of(new Travel(2, 4.0, null))),
        new HandOut(VISIT_ID, DAY.plusDays(3)),
        new ReviseInstrument(sold, 1),
        new ChooseAim(VISIT_ID, new VisitAim(AimChoice.NECK, NutMovable.NO)),
        new ChooseAim(VISIT_ID, aim()),
        new ForgetLearned(INSTRUMENT_ID, AT.minusSeconds(86400)),
        new RecordFretPlaces(INSTRUMENT_ID, fretPlaces()),
        new RecordPickups(INSTRUMENT_ID, pickups()));
  }
}
