package sillet.sheets.job;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.moves.MoveAdvisor;
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
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitRecord;

/** An invented visit of an instrument with two strings, to be read and moved by a test. */
public final class DemoVisit {
  private static final UUID ID = new UUID(7, 7);
  private static final Instant NOW = Instant.parse("2026-01-15T09:00:00Z");

  public String customer = "Ada Example (demo)";
  public String model = "Plover (demo)";
  public double referenceHz = 440;
  public final List<BenchCheck> checks = new ArrayList<>();
  private final List<Reading> readings = new ArrayList<>();
  private final List<MadeMove> moves = new ArrayList<>();

  public void read(int pass, int string, int fret, String cents) {
    readings.add(new Reading(pass, string, fret, Tries.parse(cents), Reference.OPEN, 0.3, NOW));
  }

  public void move(int pass, int string, double mm, Double turns) {
    moves.add(new MadeMove(pass, string, mm, turns, null, NOW));
  }

  public void check(CheckKind kind, int string, Moment moment, double mm) {
    CheckMethod method = kind == CheckKind.RELIEF ? CheckMethod.STRAIGHTEDGE : CheckMethod.OPEN;
    checks.add(new BenchCheck(kind, string, 12, method, moment, mm, ""));
  }

  public VisitRecord record() {
    Instrument instrument =
        new Instrument(
            ID,
            ID,
            InstrumentKind.ELECTRIC,
            "",
            model,
            "D-1",
            "T-9",
            new Neck(2, 648, 648, 22, null, false),
            new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.NOT_KNOWN, null));
    Visit visit =
        new Visit(
            ID,
            42,
            ID,
            ID,
            new Arrival(
                LocalDate.of(2026, 1, 15),
                "Ilse (demo)",
                null,
                "Set it up, please",
                "",
                20.5,
                47.0),
            new StringsOn("Light (demo)", null, "two", referenceHz, strings()),
            List.of(new Travel(1, 6.0, 2.0)),
            LocalDate.of(2026, 1, 17));
    return new VisitRecord(
        visit,
        instrument,
        new Customer(ID, customer, "", "", ""),
        checks,
        readings,
        moves,
        List.of(),
        List.of(),
        VisitAim.USUAL);
  }

  public List<List<StringPass>> passes() {
    return VisitMoves.of(record(), new MoveAdvisor(75));
  }

  private List<FittedString> strings() {
    return List.of(
        new FittedString(
            1, Pitch.parse("E4", referenceHz), 648, StringMake.of(0.010, Construction.PLAIN_STEEL)),
        new FittedString(
            2,
            Pitch.parse("E2", referenceHz),
            647.7,
            StringMake.of(0.046, Construction.WOUND_STEEL)));
  }
}
