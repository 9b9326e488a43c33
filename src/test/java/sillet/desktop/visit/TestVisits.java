package sillet.desktop.visit;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import sillet.acoustics.readings.Reference;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.shop.Customer;
import sillet.logbook.strings.FittedString;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitRecord;

/** Records of an invented visit without a logbook, for models. */
public final class TestVisits {
  private TestVisits() {}

  /** A six-string with screws of half a millimetre a turn, nothing read. */
  public static VisitRecord six(List<Travel> travel) {
    return visit(SampleVisits.six(), SampleVisits.sixStrings(648), travel);
  }

  /** Any instrument, nothing read, no room measured. */
  public static VisitRecord of(Instrument instrument, List<FittedString> strings) {
    return visit(instrument, strings, List.of());
  }

  /** Any instrument, nothing read. */
  public static VisitRecord visit(
      Instrument instrument, List<FittedString> strings, List<Travel> travel) {
    LocalDate day = LocalDate.of(2026, 12, 1);
    Arrival arrival = new Arrival(day, "Edda", day.plusDays(3), "Sour", "", null, null);
    Visit visit =
        new Visit(
            UUID.nameUUIDFromBytes(new byte[] {1}),
            2417,
            instrument.id(),
            null,
            arrival,
            new StringsOn("", null, "", 440, strings),
            travel,
            null);
    Customer customer = null;
    return new VisitRecord(
        visit,
        instrument,
        customer,
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        VisitAim.USUAL);
  }

  /** The record with more readings at fret 12, string 1 first; a blank is not read. */
  public static VisitRecord read(VisitRecord record, int pass, String... cents12) {
    List<Reading> readings = new ArrayList<>(record.readings());
    for (int i = 0; i < cents12.length; i++) {
      if (!cents12[i].isEmpty()) {
        Tries tries = Tries.parse(cents12[i]);
        readings.add(new Reading(pass, i + 1, 12, tries, Reference.OPEN, 0.3, TestDesk.NOW));
      }
    }
    return new VisitRecord(
        record.visit(),
        record.instrument(),
        record.customer(),
        record.checks(),
        readings,
        record.moves(),
        record.work(),
        record.notes(),
        record.aim());
  }

  /** The record with moves made after a pass. */
  public static VisitRecord moved(VisitRecord record, int pass, int string, double mm) {
    List<MadeMove> moves = new ArrayList<>(record.moves());
    moves.add(new MadeMove(pass, string, mm, null, null, TestDesk.NOW));
    return new VisitRecord(
        record.visit(),
        record.instrument(),
        record.customer(),
        record.checks(),
        record.readings(),
        moves,
        record.work(),
        record.notes(),
        record.aim());
  }

  /** The record with checks. */
  public static VisitRecord checked(VisitRecord record, BenchCheck... checks) {
    return new VisitRecord(
        record.visit(),
        record.instrument(),
        record.customer(),
        List.of(checks),
        record.readings(),
        record.moves(),
        record.work(),
        record.notes(),
        record.aim());
  }
}
