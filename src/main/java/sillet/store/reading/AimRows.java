package sillet.store.reading;

import java.time.Instant;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.visits.VisitAim;
import sillet.store.columns.Row;

/** What a visit is reckoned for, and from when on readings teach; of each the newest row. */
final class AimRows {
  private AimRows() {}

  static VisitAim of(Handle handle, UUID visitId) {
    return handle
        .createQuery("SELECT * FROM visit_aim WHERE visit_id = :id ORDER BY action_sequence")
        .bind("id", visitId)
        .map(
            Row.map(
                row ->
                    new VisitAim(
                        AimChoice.parse(row.text("aim")), row.kind("nut", NutMovable.class))))
        .list()
        .stream()
        .reduce(VisitAim.USUAL, (older, newer) -> newer);
  }

  static @Nullable Instant learnedFrom(Handle handle, UUID instrumentId) {
    return handle
        .createQuery(
            "SELECT * FROM learning_reset WHERE instrument_id = :id ORDER BY action_sequence")
        .bind("id", instrumentId)
        .map(Row.map(row -> row.time("learned_from")))
        .list()
        .stream()
        .reduce((older, newer) -> newer)
        .orElse(null);
  }
}
