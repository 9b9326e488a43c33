package sillet.logbook.learned;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.moves.NeckStrings;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitRecord;

/** Visits of the invented six-string of {@link NeckStrings}. */
public final class NeckVisits {
  private static final Instrument INSTRUMENT =
      new Instrument(
          new UUID(0, 1),
          null,
          InstrumentKind.ELECTRIC,
          "Test",
          "",
          "",
          "",
          new Neck(6, 648, 648, 22, null, false),
          new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.NOT_KNOWN, null));

  private NeckVisits() {}

  /** A visit of that number with one pass read on that day. */
  public static VisitRecord read(
      int ticket, LocalDate day, @Nullable LocalDate fitted, List<String> rows) {
    Visit visit =
        new Visit(
            new UUID(1, ticket),
            ticket,
            INSTRUMENT.id(),
            null,
            new Arrival(day, "", null, "", "", null, null),
            new StringsOn(
                "demo",
                fitted,
                "",
                440,
                IntStream.range(0, rows.size()).mapToObj(NeckStrings::fitted).toList()),
            List.of(),
            null);
    VisitRecord blank =
        new VisitRecord(
            visit,
            INSTRUMENT,
            null,
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            VisitAim.USUAL);
    return reading(blank, 1, rows);
  }

  /** The visit with one more pass. */
  public static VisitRecord reading(VisitRecord visit, int pass, List<String> rows) {
    Instant at = at(visit).plusSeconds(600L * pass);
    List<Reading> readings = new ArrayList<>(visit.readings());
    for (int i = 0; i < rows.size(); i++) {
      int string = i + 1;
      NoteReadings said = NeckStrings.readings(rows.get(i));
      said.frets()
          .forEach(
              (fret, tries) ->
                  readings.add(
                      new Reading(pass, string, fret, tries, said.against(), said.sdCents(), at)));
    }
    return visit.withReadings(readings);
  }

  /** The visit with one move of every string after a pass, string 1 first. */
  public static VisitRecord moved(VisitRecord visit, int pass, double... mm) {
    List<MadeMove> moves = new ArrayList<>(visit.moves());
    for (int i = 0; i < mm.length; i++) {
      moves.add(new MadeMove(pass, i + 1, mm[i], null, null, at(visit).plusSeconds(3000)));
    }
    return new VisitRecord(
        visit.visit(),
        visit.instrument(),
        visit.customer(),
        visit.checks(),
        visit.readings(),
        moves,
        visit.work(),
        visit.notes(),
        visit.aim());
  }

  /** Nine in the morning of the day it came. */
  public static Instant at(VisitRecord visit) {
    return Instant.parse(visit.visit().arrival().takenIn() + "T09:00:00Z");
  }
}
