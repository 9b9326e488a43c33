package sillet.store.engine;

import java.sql.Connection;
import java.sql.SQLException;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.function.Consumer;
import java.util.function.Function;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.Jdbi;
import org.jdbi.v3.core.JdbiException;
import org.jspecify.annotations.Nullable;

/**
 * An open database: one connection, used on the logbook's own thread only, so that callers may come
 * from any thread, and interrupted ones too.
 */
public final class Session implements AutoCloseable {
  private final String place;
  private final LogbookThread thread;
  private final Connection connection;
  private final Jdbi jdbi;
  private final AtomicBoolean closed = new AtomicBoolean();
  private @Nullable LogbookProblem doubt;

  Session(String place, LogbookThread thread, Connection connection) {
    this.place = place;
    this.thread = thread;
    this.connection = connection;
    this.jdbi = Jdbi.create(connection);
  }

  public String place() {
    return place;
  }

  /**
   * Teaches the session how values stand in columns.
   *
   * @param types registers arguments and mappers
   */
  public void teach(Consumer<Jdbi> types) {
    types.accept(jdbi);
  }

  /**
   * Asks the database.
   *
   * @param query what to ask; changes nothing
   * @return what the query returned
   * @throws LogbookProblem if the database fails
   */
  public <T> T read(Function<Handle, T> query) {
    return thread.call(
        () -> {
          try {
            return jdbi.withHandle(query::apply);
          } catch (JdbiException trouble) {
            throw ProblemSigns.read(trouble, place);
          }
        });
  }

  /**
   * Changes the database in one transaction and returns only when the change is on the disk.
   *
   * @param change what to do; whatever it throws takes everything back
   * @return what the change returned
   * @throws LogbookProblem of kind NOT_CERTAIN if the change was handed to the database but not
   *     seen to reach the disk, and CLOSED ever after; of another kind if nothing was changed
   */
  public <T> T save(Function<Handle, T> change) {
    return thread.call(() -> jdbi.withHandle(handle -> savedBy(change, handle)));
  }

  private <T> T savedBy(Function<Handle, T> change, Handle handle) {
    if (doubt != null) {
      throw new LogbookProblem(ProblemKind.CLOSED, place, doubt);
    }
    T result;
    try {
      handle.begin();
      result = change.apply(handle);
    } catch (JdbiException trouble) {
      takeBack(handle, trouble);
      throw ProblemSigns.read(trouble, place);
    } catch (RuntimeException | Error refused) {
      takeBack(handle, refused);
      throw refused;
    }
    try {
      handle.commit();
      // a commit is written, but only this waits for the disk; it cannot stand inside the
      // transaction
      handle.execute("CHECKPOINT SYNC");
    } catch (RuntimeException | Error trouble) {
      // a later sync that succeeds says nothing of what an earlier one failed to write, so this
      // session takes nothing more
      doubt = new LogbookProblem(ProblemKind.NOT_CERTAIN, place, trouble);
      throw doubt;
    }
    return result;
  }

  private static void takeBack(Handle handle, Throwable reason) {
    try {
      if (handle.isInTransaction()) {
        handle.rollback();
      }
    } catch (JdbiException alsoFailed) {
      reason.addSuppressed(alsoFailed);
    }
  }

  /**
   * Closes the database in order. A database that closed itself after trouble is left as it is.
   *
   * @throws LogbookProblem if it could not be closed in order; what was saved is on the disk
   */
  @Override
  public void close() {
    if (closed.getAndSet(true)) {
      return;
    }
    try (thread) {
      thread.call(
          () -> {
            shutDown();
            return place;
          });
    }
  }

  private void shutDown() {
    try (connection) {
      Databases.shutDownTidily(connection);
    } catch (SQLException trouble) {
      throw ProblemSigns.read(trouble, place);
    }
  }
}
