package sillet.store.saving;

import java.time.Instant;
import java.util.List;
import java.util.UUID;
import org.jdbi.v3.core.statement.PreparedBatch;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.parts.PickupsMeasured;

/** What actions add to the parts of an instrument; nothing here changes or removes a row. */
final class PartsEffects {
  private static final String FRETS =
      """
      INSERT INTO fret_measuring (action_sequence, instrument_id, measured_at, scale_mm)
      VALUES (:sequence, :instrumentId, :at, :scaleMm)
      """;
  private static final String FRET =
      """
      INSERT INTO fret_place (action_sequence, item, fret, from_nut_mm, typed)
      VALUES (:sequence, :item, :fret, :fromNutMm, :typed)
      """;
  private static final String PICKUPS =
      """
      INSERT INTO pickup_measuring (action_sequence, instrument_id, measured_at)
      VALUES (:sequence, :instrumentId, :at)
      """;
  private static final String PICKUP =
      """
      INSERT INTO pickup (action_sequence, item, name, from_bridge_mm, treble_mm, bass_mm)
      VALUES (:sequence, :item, :name, :fromBridgeMm, :trebleMm, :bassMm)
      """;

  private PartsEffects() {}

  static void frets(Change change, UUID instrumentId, FretPlaces measured) {
    change
        .handle()
        .createUpdate(FRETS)
        .bind("sequence", change.sequence())
        .bind("instrumentId", instrumentId)
        .bind("at", measured.at())
        .bind("scaleMm", measured.scaleMm())
        .execute();
    addAll(change, FRET, measured.places());
  }

  static void pickups(Change change, UUID instrumentId, PickupsMeasured measured) {
    Instant at = measured.at();
    change
        .handle()
        .createUpdate(PICKUPS)
        .bind("sequence", change.sequence())
        .bind("instrumentId", instrumentId)
        .bind("at", at)
        .execute();
    addAll(change, PICKUP, measured.pickups());
  }

  private static void addAll(Change change, String sql, List<?> records) {
    PreparedBatch batch = change.handle().prepareBatch(sql);
    for (int item = 0; item < records.size(); item++) {
      batch
          .bindMethods(records.get(item))
          .bind("sequence", change.sequence())
          .bind("item", item)
          .add();
    }
    batch.execute();
  }
}
