package sillet.store.saving;

import java.util.List;
import java.util.UUID;
import org.jdbi.v3.core.statement.PreparedBatch;
import sillet.logbook.units.Decimal;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.WorkLine;

/** What actions add to a visit; nothing here changes or removes a row. */
final class BenchEffects {
  private static final String CHECK =
      """
      INSERT INTO bench_check (action_sequence, item, visit_id, kind, string_number, fret,
        method, moment, value_mm, typed)
      VALUES (:sequence, :item, :visitId, :kind, :string, :fret,
        :method, :moment, :valueMm, :typed)
      """;
  private static final String READING =
      """
      INSERT INTO reading (action_sequence, item, visit_id, pass, string_number, fret,
        against, sd_cents, read_at)
      VALUES (:sequence, :item, :visitId, :pass, :string, :fret, :against, :sdCents, :at)
      """;
  private static final String TRY =
      """
      INSERT INTO reading_try (action_sequence, item, try_number, cents, decimals)
      VALUES (:sequence, :item, :tryNumber, :value, :decimals)
      """;
  private static final String MOVE =
      """
      INSERT INTO made_move (action_sequence, item, visit_id, pass, string_number, saddle_mm,
        turns, nut_mm, made_at)
      VALUES (:sequence, :item, :visitId, :pass, :string, :saddleMm, :turns, :nutMm, :at)
      """;
  private static final String WORK =
      """
      INSERT INTO work_line (action_sequence, visit_id, done_at, technician, work_text)
      VALUES (:sequence, :visitId, :at, :technician, :text)
      """;
  private static final String NOTE =
      """
      INSERT INTO visit_note (action_sequence, visit_id, written_at, kind, note_text)
      VALUES (:sequence, :visitId, :at, :kind, :text)
      """;

  private BenchEffects() {}

  static void checks(Change change, UUID visitId, List<BenchCheck> checks) {
    addAll(change, CHECK, visitId, checks);
  }

  static void moves(Change change, UUID visitId, List<MadeMove> moves) {
    addAll(change, MOVE, visitId, moves);
  }

  static void readings(Change change, UUID visitId, List<Reading> readings) {
    addAll(change, READING, visitId, readings);
    PreparedBatch batch = change.handle().prepareBatch(TRY);
    for (int item = 0; item < readings.size(); item++) {
      Tries tries = readings.get(item).tries();
      if (tries != null) {
        addTries(change, batch, item, tries);
      }
    }
    batch.execute();
  }

  private static void addTries(Change change, PreparedBatch batch, int item, Tries tries) {
    int number = 1;
    for (Decimal one : tries.cents()) {
      batch
          .bindMethods(one)
          .bind("sequence", change.sequence())
          .bind("item", item)
          .bind("tryNumber", number)
          .add();
      number++;
    }
  }

  private static void addAll(Change change, String sql, UUID visitId, List<?> records) {
    PreparedBatch batch = change.handle().prepareBatch(sql);
    for (int item = 0; item < records.size(); item++) {
      batch
          .bindMethods(records.get(item))
          .bind("sequence", change.sequence())
          .bind("visitId", visitId)
          .bind("item", item)
          .add();
    }
    batch.execute();
  }

  static void work(Change change, UUID visitId, WorkLine line) {
    addOne(change, WORK, visitId, line);
  }

  static void note(Change change, UUID visitId, VisitNote note) {
    addOne(change, NOTE, visitId, note);
  }

  private static void addOne(Change change, String sql, UUID visitId, Object line) {
    change
        .handle()
        .createUpdate(sql)
        .bindMethods(line)
        .bind("sequence", change.sequence())
        .bind("visitId", visitId)
        .execute();
  }
}
