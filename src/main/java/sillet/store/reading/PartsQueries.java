package sillet.store.reading;

import java.util.List;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import sillet.logbook.parts.FretPlace;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.parts.Pickup;
import sillet.logbook.parts.PickupsMeasured;
import sillet.store.columns.Row;
import sillet.store.engine.Session;

/** Questions about the parts of an instrument that are measured by themselves. */
public final class PartsQueries {
  private final Session session;

  /**
   * Asks a session.
   *
   * @param session open, its columns taught
   */
  public PartsQueries(Session session) {
    this.session = session;
  }

  /**
   * Where the frets were measured.
   *
   * @param instrumentId the instrument
   * @return every measuring, the newest first
   */
  public List<FretPlaces> frets(UUID instrumentId) {
    return session.read(
        handle ->
            handle
                .createQuery(
                    "SELECT * FROM fret_measuring WHERE instrument_id = :id"
                        + " ORDER BY action_sequence DESC")
                .bind("id", instrumentId)
                .map(
                    Row.map(
                        row ->
                            new FretPlaces(
                                row.time("measured_at"),
                                row.number("scale_mm"),
                                places(handle, row.sequence("action_sequence")))))
                .list());
  }

  private static List<FretPlace> places(Handle handle, long sequence) {
    return handle
        .createQuery("SELECT * FROM fret_place WHERE action_sequence = :sequence ORDER BY item")
        .bind("sequence", sequence)
        .map(
            Row.map(
                row ->
                    new FretPlace(
                        row.integer("fret"), row.number("from_nut_mm"), row.text("typed"))))
        .list();
  }

  /**
   * Where the pickups stand and how high: the height log.
   *
   * @param instrumentId the instrument
   * @return every measuring, the newest first
   */
  public List<PickupsMeasured> pickups(UUID instrumentId) {
    return session.read(
        handle ->
            handle
                .createQuery(
                    "SELECT * FROM pickup_measuring WHERE instrument_id = :id"
                        + " ORDER BY action_sequence DESC")
                .bind("id", instrumentId)
                .map(
                    Row.map(
                        row ->
                            new PickupsMeasured(
                                row.time("measured_at"),
                                pickups(handle, row.sequence("action_sequence")))))
                .list());
  }

  private static List<Pickup> pickups(Handle handle, long sequence) {
    return handle
        .createQuery("SELECT * FROM pickup WHERE action_sequence = :sequence ORDER BY item")
        .bind("sequence", sequence)
        .map(
            Row.map(
                row ->
                    new Pickup(
                        row.text("name"),
                        row.number("from_bridge_mm"),
                        row.numberOrNull("treble_mm"),
                        row.numberOrNull("bass_mm"))))
        .list();
  }
}
