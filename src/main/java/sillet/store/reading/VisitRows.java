package sillet.store.reading;

import java.sql.SQLException;
import java.util.List;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import sillet.logbook.strings.FittedString;
import sillet.logbook.units.Pitch;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;
import sillet.store.columns.Row;

/** The stay itself out of its rows: arrival, strings and travel. */
final class VisitRows {
  private VisitRows() {}

  /** Reads a visit v of a joined row, and its strings and travel by further questions. */
  static Visit visit(Handle handle, Row row) throws SQLException {
    UUID id = row.id("v_id");
    return new Visit(
        id,
        row.integer("ticket"),
        row.id("instrument_id"),
        row.idOrNull("v_customer_id"),
        arrival(row),
        new StringsOn(
            row.text("set_name"),
            row.dayOrNull("fitted_on"),
            row.text("tuning_name"),
            row.number("reference_hz"),
            strings(handle, id)),
        travel(handle, id),
        row.dayOrNull("handed_out"));
  }

  private static Arrival arrival(Row row) throws SQLException {
    return new Arrival(
        row.day("taken_in"),
        row.text("taken_in_by"),
        row.dayOrNull("promised"),
        row.text("request"),
        row.text("condition_seen"),
        row.numberOrNull("temperature_c"),
        row.numberOrNull("humidity_pct"));
  }

  private static List<FittedString> strings(Handle handle, UUID visitId) {
    return handle
        .createQuery("SELECT * FROM fitted_string WHERE visit_id = :id ORDER BY item")
        .bind("id", visitId)
        .map(
            Row.map(
                row ->
                    new FittedString(
                        row.integer("string_number"),
                        new Pitch(row.text("pitch_typed"), row.number("pitch_hz")),
                        row.number("scale_mm"),
                        Records.make(row))))
        .list();
  }

  private static List<Travel> travel(Handle handle, UUID visitId) {
    return handle
        .createQuery("SELECT * FROM saddle_travel WHERE visit_id = :id ORDER BY item")
        .bind("id", visitId)
        .map(
            Row.map(
                row ->
                    new Travel(
                        row.integer("string_number"),
                        row.numberOrNull("back_mm"),
                        row.numberOrNull("forward_mm"))))
        .list();
  }
}
