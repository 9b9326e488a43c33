package sillet.store.saving;

import java.util.List;
import sillet.store.columns.Row;
import sillet.store.engine.Session;

/** Reads recorded actions, and makes a logbook again from nothing but them. */
public final class Replay {
  private static final String ROWS =
      """
      SELECT sequence, done_at, technician, name, form, values_json FROM action
      WHERE sequence > :after ORDER BY sequence
      """;

  private final Session session;
  private final Saving saving;

  /**
   * Works on a session.
   *
   * @param session open, its columns taught
   * @param saving of the same session
   */
  public Replay(Session session, Saving saving) {
    this.session = session;
    this.saving = saving;
  }

  /**
   * Reads what was recorded.
   *
   * @param after number of the last action that is known already, 0 for none
   * @return the rows after it, in order
   */
  public List<ActionRow> recorded(long after) {
    return session.read(
        handle ->
            handle
                .createQuery(ROWS)
                .bind("after", after)
                .map(
                    Row.map(
                        row ->
                            new ActionRow(
                                row.sequence("sequence"),
                                row.time("done_at"),
                                row.text("technician"),
                                row.text("name"),
                                row.integer("form"),
                                row.text("values_json"))))
                .list());
  }

  /**
   * Does recorded actions again. It stops at the first row that fails; the rows before it are
   * saved.
   *
   * @param rows without gaps; the first is the next one of this logbook, number 1 in an empty one
   * @throws IllegalArgumentException if a row is not the next one
   * @throws sillet.store.engine.LogbookProblem if a row cannot be read or done
   */
  public void perform(List<ActionRow> rows) {
    rows.forEach(saving::performAgain);
  }
}
