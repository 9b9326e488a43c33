package sillet.store.reading;

import java.sql.SQLException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;
import sillet.logbook.units.Decimal;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.WorkLine;
import sillet.store.columns.Row;

/** What was added to a visit, in the order in which it was added. */
final class BenchRows {
  private BenchRows() {}

  private record Place(long sequence, int item) {
    static Place of(Row row) throws SQLException {
      return new Place(row.sequence("action_sequence"), row.integer("item"));
    }
  }

  private record OneTry(Place place, Decimal cents) {}

  /** What a check measures; a newer figure of the same thing stands for the older one. */
  private record Thing(CheckKind kind, int string, int fret, CheckMethod method, Moment moment) {
    static Thing of(BenchCheck check) {
      return new Thing(check.kind(), check.string(), check.fret(), check.method(), check.moment());
    }
  }

  private static <T> List<T> rows(
      Handle handle, String table, String order, UUID visitId, Row.Reads<T> reads) {
    return handle
        .createQuery("SELECT * FROM " + table + " WHERE visit_id = :id ORDER BY " + order)
        .bind("id", visitId)
        .map(Row.map(reads))
        .list();
  }

  static List<BenchCheck> checks(Handle handle, UUID visitId) {
    Map<Thing, BenchCheck> newest = new LinkedHashMap<>();
    for (BenchCheck check :
        rows(handle, "bench_check", "action_sequence, item", visitId, BenchRows::check)) {
      newest.remove(Thing.of(check));
      newest.put(Thing.of(check), check);
    }
    return List.copyOf(newest.values());
  }

  private static BenchCheck check(Row row) throws SQLException {
    return new BenchCheck(
        row.kind("kind", CheckKind.class),
        row.integer("string_number"),
        row.integer("fret"),
        row.kind("method", CheckMethod.class),
        row.kind("moment", Moment.class),
        row.number("value_mm"),
        row.text("typed"));
  }

  static List<Reading> readings(Handle handle, UUID visitId) {
    Map<Place, List<Decimal>> tries = new HashMap<>();
    handle
        .createQuery(
            """
            SELECT t.action_sequence, t.item, t.cents, t.decimals
            FROM reading_try t
            JOIN reading r ON r.action_sequence = t.action_sequence AND r.item = t.item
            WHERE r.visit_id = :id ORDER BY t.action_sequence, t.item, t.try_number
            """)
        .bind("id", visitId)
        .map(Row.map(BenchRows::oneTry))
        .forEach(
            one -> tries.computeIfAbsent(one.place(), p -> new ArrayList<>()).add(one.cents()));
    return rows(
        handle,
        "reading",
        "action_sequence, item",
        visitId,
        row -> reading(row, tries.get(Place.of(row))));
  }

  private static OneTry oneTry(Row row) throws SQLException {
    return new OneTry(Place.of(row), new Decimal(row.number("cents"), row.integer("decimals")));
  }

  private static Reading reading(Row row, @Nullable List<Decimal> tries) throws SQLException {
    return new Reading(
        row.integer("pass"),
        row.integer("string_number"),
        row.integer("fret"),
        tries == null ? null : new Tries(tries),
        row.kind("against", Reference.class),
        row.number("sd_cents"),
        row.time("read_at"));
  }

  static List<MadeMove> moves(Handle handle, UUID visitId) {
    return rows(
        handle,
        "made_move",
        "action_sequence, item",
        visitId,
        row ->
            new MadeMove(
                row.integer("pass"),
                row.integer("string_number"),
                row.number("saddle_mm"),
                row.numberOrNull("turns"),
                row.numberOrNull("nut_mm"),
                row.time("made_at")));
  }

  static List<WorkLine> work(Handle handle, UUID visitId) {
    return rows(
        handle,
        "work_line",
        "action_sequence",
        visitId,
        row -> new WorkLine(row.time("done_at"), row.text("technician"), row.text("work_text")));
  }

  static List<VisitNote> notes(Handle handle, UUID visitId) {
    return rows(
        handle,
        "visit_note",
        "action_sequence",
        visitId,
        row ->
            new VisitNote(
                row.time("written_at"), row.kind("kind", NoteKind.class), row.text("note_text")));
  }
}
