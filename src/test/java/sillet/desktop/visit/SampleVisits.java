package sillet.desktop.visit;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.shop.Customer;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;
import sillet.store.Logbook;

/** Invented visits of invented people; gauges and tunings are common practice, no source. */
public final class SampleVisits {
  private static final LocalDate DAY = LocalDate.of(2026, 12, 1);
  private static final Saddle SCREWS =
      new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.CLOCKWISE_AWAY, null);

  private final Logbook logbook;
  private final UUID visitId = id("visit");

  public SampleVisits(Logbook logbook) {
    this.logbook = logbook;
  }

  static UUID id(String thing) {
    return UUID.nameUUIDFromBytes(thing.getBytes(StandardCharsets.UTF_8));
  }

  private void perform(sillet.logbook.actions.Action action) {
    logbook.perform(action, "Noor");
  }

  /** Takes an instrument in under a ticket. */
  public int takeIn(Instrument instrument, List<FittedString> strings, List<Travel> travel) {
    return takeIn(
        instrument,
        strings,
        travel,
        new Customer(id("maren"), "Maren Oduya", "555 0148", "", "Plays with a capo at 2"),
        "Sour past the seventh fret. Strings are a week old.");
  }

  int takeIn(
      Instrument instrument,
      List<FittedString> strings,
      List<Travel> travel,
      @Nullable Customer customer,
      String request) {
    if (customer != null) {
      perform(new AddCustomer(customer));
    }
    perform(new AddInstrument(instrument));
    Arrival arrival = new Arrival(DAY, "Edda", DAY.plusDays(3), request, "", 20.8, 44.0);
    StringsOn on = new StringsOn("Light six", null, "", 440, strings);
    UUID owner = customer == null ? null : customer.id();
    perform(
        new TakeIn(new Visit(visitId, 2417, instrument.id(), owner, arrival, on, travel, null)));
    return 2417;
  }

  /** Takes the six-string in once more, under another number. */
  public static void takeInAs(Logbook logbook, int ticket) {
    Arrival arrival = new Arrival(DAY, "Edda", null, "Again", "", null, null);
    StringsOn on = new StringsOn("", null, "", 440, sixStrings(648));
    Visit visit =
        new Visit(id("visit " + ticket), ticket, six().id(), null, arrival, on, List.of(), null);
    logbook.perform(new TakeIn(visit), "Edda");
  }

  public static Instrument six() {
    return electric("Ottersby", "Fieldfare", new Neck(6, 648, 648, 22, 305.0, false), SCREWS);
  }

  public static Instrument electric(String maker, String model, Neck neck, Saddle saddle) {
    return new Instrument(
        id(model), id("maren"), InstrumentKind.ELECTRIC, maker, model, "0382", "", neck, saddle);
  }

  public static List<FittedString> sixStrings(double scaleMm) {
    return strings(
        scaleMm, "E4 .010 p", "B3 .013 p", "G3 .017 p", "D3 .026 w", "A2 .036 w", "E2 .046 w");
  }

  public static List<FittedString> strings(double scaleMm, String... specs) {
    List<FittedString> strings = new ArrayList<>();
    for (String spec : specs) {
      String[] parts = spec.split(" ", -1);
      Construction construction =
          switch (parts[2]) {
            case "p" -> Construction.PLAIN_STEEL;
            case "b" -> Construction.WOUND_BRONZE;
            default -> Construction.WOUND_STEEL;
          };
      strings.add(
          new FittedString(
              strings.size() + 1,
              Pitch.parse(parts[0], 440),
              scaleMm,
              StringMake.of(Double.parseDouble(parts[1]), construction)));
    }
    return strings;
  }

  public static List<Travel> travel(int strings, double back, double forward) {
    List<Travel> travel = new ArrayList<>();
    for (int string = 1; string <= strings; string++) {
      travel.add(new Travel(string, back, forward));
    }
    return travel;
  }

  /** Travel ends one millimetre before the nominal scale and seven behind it, on every string. */
  public static List<Travel> brackets(double... setbackMm) {
    List<Travel> travel = new ArrayList<>();
    for (int i = 0; i < setbackMm.length; i++) {
      travel.add(new Travel(i + 1, 7 - setbackMm[i], setbackMm[i] + 1));
    }
    return travel;
  }

  /** Reads a fret on string after string; a blank is not read. */
  public SampleVisits read(int pass, int fret, String... cents) {
    List<Reading> readings = new ArrayList<>();
    for (int i = 0; i < cents.length; i++) {
      if (!cents[i].isEmpty()) {
        readings.add(
            new Reading(
                pass, i + 1, fret, Tries.parse(cents[i]), Reference.OPEN, 0.3, TestDesk.NOW));
      }
    }
    perform(new RecordReadings(visitId, readings));
    return this;
  }

  SampleVisits move(double... mm) {
    List<MadeMove> moves = new ArrayList<>();
    for (int i = 0; i < mm.length; i++) {
      if (mm[i] != 0) {
        moves.add(new MadeMove(1, i + 1, mm[i], Math.abs(mm[i]) / 0.5, null, TestDesk.NOW));
      }
    }
    perform(new RecordMoves(visitId, moves));
    return this;
  }

  public SampleVisits check(int strings) {
    List<BenchCheck> checks =
        List.of(
            new BenchCheck(
                CheckKind.RELIEF, 0, 8, CheckMethod.STRAIGHTEDGE, Moment.RECEIVED, 0.31, "0.31"),
            check(CheckKind.ACTION, 1, 12, Moment.RECEIVED, 1.6),
            check(CheckKind.ACTION, strings, 12, Moment.RECEIVED, 2.1),
            check(CheckKind.FIRST_FRET_CLEARANCE, 1, 1, Moment.RECEIVED, 0.42),
            check(CheckKind.FIRST_FRET_CLEARANCE, strings, 1, Moment.RECEIVED, 0.56));
    perform(new RecordChecks(visitId, checks));
    return this;
  }

  private static BenchCheck check(CheckKind kind, int string, int fret, Moment moment, double mm) {
    return new BenchCheck(kind, string, fret, CheckMethod.OPEN, moment, mm, Double.toString(mm));
  }
}
