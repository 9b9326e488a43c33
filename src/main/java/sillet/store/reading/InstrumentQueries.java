package sillet.store.reading;

import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import sillet.logbook.instruments.Instrument;
import sillet.store.columns.Row;
import sillet.store.engine.Session;

/** Questions about instruments. */
public final class InstrumentQueries {
  private static final String LINES =
      "SELECT "
          + Records.INSTRUMENT
          + ", "
          + Records.CUSTOMER
          + """
            , (SELECT COUNT(*) FROM visit v WHERE v.instrument_id = i.id) AS visits
            , (SELECT MAX(v.taken_in) FROM visit v WHERE v.instrument_id = i.id) AS last_taken_in
            , (SELECT MAX(v.ticket) FROM visit v
                WHERE v.instrument_id = i.id AND v.handed_out IS NULL) AS open_ticket
            """;
  private static final String FROM =
      " FROM instrument i LEFT JOIN customer c ON c.id = i.customer_id WHERE ";
  private static final String TICKET =
      "EXISTS (SELECT 1 FROM visit v WHERE v.instrument_id = i.id AND v.ticket = %s)";
  private static final List<String> KEYS = List.of("i.search_key", "c.search_key");

  private final Session session;

  /**
   * Asks a session.
   *
   * @param session open, its columns taught
   */
  public InstrumentQueries(Session session) {
    this.session = session;
  }

  /**
   * Looks for instruments by maker, model, serial, tag, ticket number, and by their customer's
   * name, telephone number and address.
   *
   * @param typed words, each of which has to be found, with or without accents; blank for all
   * @return what was on the bench last first
   */
  public Found<InstrumentLine> search(String typed) {
    SearchClause clause = SearchClause.of(typed, KEYS, TICKET);
    return session.read(handle -> new Found<>(newest(handle, clause), count(handle, clause)));
  }

  private static List<InstrumentLine> newest(Handle handle, SearchClause clause) {
    return handle
        .createQuery(LINES + FROM + clause.sql() + " ORDER BY i.last_action DESC, i.id LIMIT :most")
        .bindMap(clause.values())
        .bind("most", Found.MOST)
        .map(Row.map(InstrumentQueries::line))
        .list();
  }

  private static int count(Handle handle, SearchClause clause) {
    return handle
        .createQuery("SELECT COUNT(*)" + FROM + clause.sql())
        .bindMap(clause.values())
        .mapTo(Integer.class)
        .one();
  }

  /**
   * One instrument.
   *
   * @param id identity
   * @return the instrument with its customer, or nothing
   */
  public Optional<InstrumentLine> instrument(UUID id) {
    return session.read(
        handle ->
            handle
                .createQuery(LINES + FROM + "i.id = :id")
                .bind("id", id)
                .map(Row.map(InstrumentQueries::line))
                .findOne());
  }

  private static InstrumentLine line(Row row) throws SQLException {
    Instrument instrument = Records.instrument(row);
    return new InstrumentLine(
        new Kept<>(instrument, row.integer("i_version")),
        Records.customerOrNull(row),
        row.integer("visits"),
        row.dayOrNull("last_taken_in"),
        row.integerOrNull("open_ticket"));
  }
}
