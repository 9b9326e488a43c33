package sillet.desktop.controls;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.VisitRecord;

/** Makes invented visits of a two-string instrument for the tests of models. */
public final class Visits {
  private static final Instant AT = Instant.parse("2025-12-01T10:00:00Z");

  private final int ticket;
  private LocalDate takenIn = LocalDate.of(2025, 12, 1);
  private @Nullable LocalDate promised;
  private final List<Reading> readings = new ArrayList<>();
  private final List<MadeMove> moves = new ArrayList<>();
  private final List<BenchCheck> checks = new ArrayList<>();
  private final List<VisitNote> notes = new ArrayList<>();

  private Visits(int ticket) {
    this.ticket = ticket;
  }

  public static Visits ticket(int ticket) {
    return new Visits(ticket);
  }

  public Visits takenIn(String day) {
    takenIn = LocalDate.parse(day);
    return this;
  }

  public Visits promised(String day) {
    promised = LocalDate.parse(day);
    return this;
  }

  /** Cents at fret 12; null takes back what was read. */
  public Visits read(int pass, int string, @Nullable String cents) {
    return read(pass, string, 12, cents);
  }

  public Visits read(int pass, int string, int fret, @Nullable String cents) {
    Tries tries = cents == null ? null : Tries.parse(cents);
    readings.add(new Reading(pass, string, fret, tries, Reference.OPEN, 0.3, AT));
    return this;
  }

  public Visits moved(int pass, int string, double mm) {
    moves.add(new MadeMove(pass, string, mm, Math.abs(mm) * 2, null, AT));
    return this;
  }

  public Visits check(BenchCheck check) {
    checks.add(check);
    return this;
  }

  public Visits note(VisitNote note) {
    notes.add(note);
    return this;
  }

  public VisitRecord record() {
    Instrument instrument =
        new Instrument(
            UUID.nameUUIDFromBytes(new byte[] {1}),
            null,
            InstrumentKind.OTHER,
            "Invented",
            "Two",
            "",
            "",
            new Neck(2, 648, 648, 22, null, false),
            new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.NOT_KNOWN, null));
    StringMake make = StringMake.of(.010, Construction.PLAIN_STEEL);
    List<FittedString> strings =
        List.of(
            new FittedString(1, Pitch.parse("E4", 440), 648, make),
            new FittedString(2, Pitch.parse("B3", 440), 648, make));
    Visit visit =
        new Visit(
            UUID.nameUUIDFromBytes(new byte[] {(byte) ticket}),
            ticket,
            instrument.id(),
            null,
            new Arrival(takenIn, "Noor", promised, "", "", null, null),
            new StringsOn("", null, "", 440, strings),
            List.of(),
            null);
    return new VisitRecord(
        visit, instrument, null, checks, readings, moves, List.of(), notes, VisitAim.USUAL);
  }
}
