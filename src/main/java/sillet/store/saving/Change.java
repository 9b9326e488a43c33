package sillet.store.saving;

import java.util.UUID;
import org.jdbi.v3.core.Handle;
import sillet.store.engine.LogbookProblem;
import sillet.store.engine.ProblemKind;

/**
 * An action on its way into the tables.
 *
 * @param handle inside the action's transaction
 * @param place where the logbook lies
 * @param sequence number of the action
 */
record Change(Handle handle, String place, long sequence) {

  /**
   * Makes sure that a row was changed.
   *
   * @param rows how many were
   * @param table one of the program's own names
   * @param id of the row
   * @throws LogbookProblem of kind CONFLICT if the row has another version by now, NOT_THERE if
   *     there is no such row
   */
  void mustBeOne(int rows, String table, UUID id) {
    if (rows == 1) {
      return;
    }
    boolean there =
        handle
                .createQuery("SELECT COUNT(*) FROM " + table + " WHERE id = :id")
                .bind("id", id)
                .mapTo(Integer.class)
                .one()
            > 0;
    throw new LogbookProblem(there ? ProblemKind.CONFLICT : ProblemKind.NOT_THERE, place, null);
  }
}
