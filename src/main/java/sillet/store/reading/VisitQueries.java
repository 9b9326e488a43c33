package sillet.store.reading;

import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitRecord;
import sillet.store.columns.Row;
import sillet.store.engine.Session;

/** Questions about visits. */
public final class VisitQueries {
  private static final String VISITS =
      "SELECT v.id AS v_id, v.ticket, v.instrument_id, v.customer_id AS v_customer_id,"
          + " v.taken_in, v.taken_in_by, v.promised, v.request, v.condition_seen, v.temperature_c,"
          + " v.humidity_pct, v.set_name, v.fitted_on, v.tuning_name, v.reference_hz, v.handed_out, "
          + Records.INSTRUMENT
          + ", "
          + Records.CUSTOMER
          + " FROM visit v JOIN instrument i ON i.id = v.instrument_id"
          + " LEFT JOIN customer c ON c.id = v.customer_id ";

  private final Session session;

  /**
   * Asks a session.
   *
   * @param session open, its columns taught
   */
  public VisitQueries(Session session) {
    this.session = session;
  }

  /**
   * What is on the bench.
   *
   * @return visits not handed out, the oldest ticket first
   */
  public List<VisitLine> open() {
    return session.read(
        handle ->
            handle
                .createQuery(VISITS + "WHERE v.handed_out IS NULL ORDER BY v.ticket")
                .map(Row.map(VisitQueries::line))
                .list());
  }

  private static VisitLine line(Row row) throws SQLException {
    return new VisitLine(
        row.id("v_id"),
        row.integer("ticket"),
        row.day("taken_in"),
        row.dayOrNull("promised"),
        row.text("request"),
        Records.instrument(row),
        Records.customerOrNull(row));
  }

  /**
   * One visit by its number.
   *
   * @param ticket number
   * @return everything of the visit, or nothing
   */
  public Optional<VisitRecord> byTicket(int ticket) {
    return records("WHERE v.ticket = :asked", ticket).stream().findFirst();
  }

  /**
   * One visit by its identity.
   *
   * @param id identity
   * @return everything of the visit, or nothing
   */
  public Optional<VisitRecord> byId(UUID id) {
    return records("WHERE v.id = :asked", id).stream().findFirst();
  }

  /**
   * The history of an instrument.
   *
   * @param instrumentId identity
   * @return everything of its visits, the newest first
   */
  public List<VisitRecord> ofInstrument(UUID instrumentId) {
    return records(
        "WHERE v.instrument_id = :asked ORDER BY v.taken_in DESC, v.ticket DESC", instrumentId);
  }

  /**
   * What is known of an instrument from before a visit.
   *
   * @param record the visit
   * @return the visits of the same instrument with a lower ticket, and from when on they teach
   */
  public InstrumentPast past(VisitRecord record) {
    UUID instrument = record.visit().instrumentId();
    List<VisitRecord> earlier =
        records("WHERE v.instrument_id = :asked ORDER BY v.taken_in, v.ticket", instrument).stream()
            .filter(one -> one.visit().ticket() < record.visit().ticket())
            .toList();
    return new InstrumentPast(
        earlier, session.read(handle -> AimRows.learnedFrom(handle, instrument)));
  }

  /**
   * The number for the next visit.
   *
   * @return one more than the highest there is, from 1
   */
  public int nextTicket() {
    return session.read(
        handle ->
            handle
                .createQuery("SELECT COALESCE(MAX(ticket), 0) + 1 FROM visit")
                .mapTo(Integer.class)
                .one());
  }

  private List<VisitRecord> records(String condition, Object asked) {
    return session.read(
        handle ->
            handle
                .createQuery(VISITS + condition)
                .bind("asked", asked)
                .map(Row.map(row -> record(handle, row)))
                .list());
  }

  private static VisitRecord record(Handle handle, Row row) throws SQLException {
    Visit visit = VisitRows.visit(handle, row);
    return new VisitRecord(
        visit,
        Records.instrument(row),
        Records.customerOrNull(row),
        BenchRows.checks(handle, visit.id()),
        BenchRows.readings(handle, visit.id()),
        BenchRows.moves(handle, visit.id()),
        BenchRows.work(handle, visit.id()),
        BenchRows.notes(handle, visit.id()),
        AimRows.of(handle, visit.id()));
  }
}
