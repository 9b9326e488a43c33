package sillet.store.saving;

import java.time.Instant;
import java.util.UUID;
import sillet.logbook.visits.VisitAim;

/** What actions do to what is reckoned: the aim of a visit, and from when on readings teach. */
final class LearningEffects {
  private static final String INSERT_AIM =
      """
      INSERT INTO visit_aim (action_sequence, visit_id, aim, nut)
      VALUES (:sequence, :visitId, :aim, :nut)
      """;
  private static final String INSERT_RESET =
      """
      INSERT INTO learning_reset (action_sequence, instrument_id, learned_from)
      VALUES (:sequence, :instrumentId, :from)
      """;

  private LearningEffects() {}

  static void aim(Change change, UUID visitId, VisitAim aim) {
    change
        .handle()
        .createUpdate(INSERT_AIM)
        .bind("sequence", change.sequence())
        .bind("visitId", visitId)
        .bind("aim", aim.aim().word())
        .bind("nut", aim.nut())
        .execute();
  }

  static void reset(Change change, UUID instrumentId, Instant from) {
    change
        .handle()
        .createUpdate(INSERT_RESET)
        .bind("sequence", change.sequence())
        .bind("instrumentId", instrumentId)
        .bind("from", from)
        .execute();
  }
}
