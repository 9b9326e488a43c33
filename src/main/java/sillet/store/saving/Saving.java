package sillet.store.saving;

import com.google.gson.JsonElement;
import java.time.Clock;
import java.time.Instant;
import org.jdbi.v3.core.Handle;
import sillet.logbook.actions.Action;
import sillet.store.columns.ColumnTypes;
import sillet.store.engine.Session;

/** The one place through which anything in a logbook changes. */
public final class Saving {
  private static final String RECORD =
      """
      INSERT INTO action (sequence, done_at, technician, name, form, values_json)
      VALUES (:sequence, :at, :technician, :name, :form, :values)
      """;

  private final Session session;
  private final Clock clock;
  private final ActionForms forms = new ActionForms();

  /**
   * Saves into a session.
   *
   * @param session open, its columns taught
   * @param clock says when
   */
  public Saving(Session session, Clock clock) {
    this.session = session;
    this.clock = clock;
  }

  /**
   * Does an action: all of it and its own row in one transaction, then waits for the disk. What
   * this returns may be called saved.
   *
   * @param action what to do
   * @param technician who does it
   * @return number and time
   * @throws sillet.logbook.text.Rejection if a text in it cannot be kept; nothing was saved
   * @throws sillet.store.engine.LogbookProblem if it cannot be done; nothing was saved, except
   *     perhaps where the kind is NOT_CERTAIN
   */
  public Saved perform(Action action, String technician) {
    JsonElement values = forms.tree(action);
    KeepableText.check(values);
    KeepableText.check(technician);
    String text = forms.text(values);
    return session.save(
        handle -> {
          Instant at = ColumnTypes.kept(clock.instant());
          long sequence = nextSequence(handle);
          return record(
              handle,
              new ActionRow(sequence, at, technician, action.name(), action.form(), text),
              action);
        });
  }

  /**
   * Does a recorded action again, with the number, time and technician it had.
   *
   * @param row a row whose number is the next one of this logbook
   * @return number and time
   * @throws IllegalArgumentException if the row is not the next one
   * @throws sillet.store.engine.LogbookProblem as {@link #perform}, or if the row cannot be read
   */
  Saved performAgain(ActionRow row) {
    Action action = forms.read(row);
    return session.save(
        handle -> {
          long next = nextSequence(handle);
          if (row.sequence() != next) {
            throw new IllegalArgumentException(
                "action " + row.sequence() + " comes where " + next + " is due");
          }
          return record(handle, row, action);
        });
  }

  private Saved record(Handle handle, ActionRow row, Action action) {
    handle.createUpdate(RECORD).bindMethods(row).execute();
    Effects.apply(new Change(handle, session.place(), row.sequence()), action);
    return new Saved(row.sequence(), row.at());
  }

  private static long nextSequence(Handle handle) {
    return handle
        .createQuery("SELECT COALESCE(MAX(sequence), 0) + 1 FROM action")
        .mapTo(Long.class)
        .one();
  }
}
