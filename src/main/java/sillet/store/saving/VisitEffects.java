package sillet.store.saving;

import java.time.LocalDate;
import java.util.List;
import java.util.UUID;
import org.jdbi.v3.core.statement.PreparedBatch;
import sillet.logbook.strings.FittedString;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;

/** What actions do to a visit as a whole. */
final class VisitEffects {
  private static final String INSERT =
      """
      INSERT INTO visit (id, version, ticket, instrument_id, customer_id, taken_in, taken_in_by,
        promised, request, condition_seen, temperature_c, humidity_pct, set_name, fitted_on,
        tuning_name, reference_hz, handed_out)
      VALUES (:id, 1, :ticket, :instrumentId, :customerId, :arrival.takenIn, :arrival.takenInBy,
        :arrival.promised, :arrival.request, :arrival.condition, :arrival.temperatureC,
        :arrival.humidityPct, :strings.setName, :strings.fittedOn, :strings.tuningName,
        :strings.referenceHz, :handedOut)
      """;
  private static final String INSERT_STRING =
      """
      INSERT INTO fitted_string (visit_id, item, string_number, pitch_typed, pitch_hz, scale_mm,
        gauge_in, construction, core_in, unit_mass_g_m)
      VALUES (:visitId, :item, :number, :pitch.typed, :pitch.hz, :scaleMm,
        :make.gaugeIn, :make.construction, :make.coreIn, :make.unitMassGPerM)
      """;
  private static final String INSERT_TRAVEL =
      """
      INSERT INTO saddle_travel (visit_id, item, string_number, back_mm, forward_mm)
      VALUES (:visitId, :item, :string, :backMm, :forwardMm)
      """;
  private static final String UPDATE_TRAVEL =
      """
      UPDATE saddle_travel SET back_mm = :backMm, forward_mm = :forwardMm
      WHERE visit_id = :visitId AND string_number = :string
      """;

  /** Behind what is there; the keys of a visit's rows need no other order. */
  private static final String ADD_TRAVEL =
      """
      INSERT INTO saddle_travel (visit_id, item, string_number, back_mm, forward_mm)
      SELECT :visitId, COALESCE(MAX(t.item), -1) + 1, :string, :backMm, :forwardMm
      FROM saddle_travel t WHERE t.visit_id = :visitId
      """;

  private static final String TOUCH_INSTRUMENT =
      """
      UPDATE instrument SET last_action = :sequence
      WHERE id = (SELECT v.instrument_id FROM visit v WHERE v.id = :visitId)
      """;
  private static final String TOUCH_CUSTOMER =
      """
      UPDATE customer SET last_action = :sequence
      WHERE id = (SELECT v.customer_id FROM visit v WHERE v.id = :visitId)
      """;

  private VisitEffects() {}

  static void takeIn(Change change, Visit visit) {
    change.handle().createUpdate(INSERT).bindMethods(visit).execute();
    PreparedBatch strings = change.handle().prepareBatch(INSERT_STRING);
    int item = 0;
    for (FittedString string : visit.strings().strings()) {
      strings.bindMethods(string).bind("visitId", visit.id()).bind("item", item).add();
      item++;
    }
    strings.execute();
    PreparedBatch travel = change.handle().prepareBatch(INSERT_TRAVEL);
    item = 0;
    for (Travel room : visit.travel()) {
      travel.bindMethods(room).bind("visitId", visit.id()).bind("item", item).add();
      item++;
    }
    travel.execute();
    touch(change, visit.id());
  }

  /** Puts the room at each saddle in place of what was known of it. */
  static void travel(Change change, UUID visitId, List<Travel> travel) {
    for (Travel room : travel) {
      int known =
          change
              .handle()
              .createUpdate(UPDATE_TRAVEL)
              .bindMethods(room)
              .bind("visitId", visitId)
              .execute();
      if (known == 0) {
        change
            .handle()
            .createUpdate(ADD_TRAVEL)
            .bindMethods(room)
            .bind("visitId", visitId)
            .execute();
      }
    }
    touch(change, visitId);
  }

  static void handOut(Change change, UUID visitId, LocalDate day) {
    int rows =
        change
            .handle()
            .createUpdate(
                "UPDATE visit SET version = version + 1, handed_out = :day WHERE id = :id")
            .bind("day", day)
            .bind("id", visitId)
            .execute();
    change.mustBeOne(rows, "visit", visitId);
    touch(change, visitId);
  }

  /** Lists begin with what was on the bench last. */
  private static void touch(Change change, UUID visitId) {
    for (String sql : new String[] {TOUCH_INSTRUMENT, TOUCH_CUSTOMER}) {
      change
          .handle()
          .createUpdate(sql)
          .bind("sequence", change.sequence())
          .bind("visitId", visitId)
          .execute();
    }
  }
}
