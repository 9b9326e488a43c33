package sillet.store.engine;

import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.RejectedExecutionException;
import java.util.function.Supplier;

/**
 * The one thread that touches a database. H2 closes itself for good when the thread that works in
 * it is interrupted, so work is handed over here and the caller waits without letting an interrupt
 * through: the caller keeps its interrupt for later, the database never hears of it. The thread is
 * a daemon, so that a program that ends without closing still lets H2 close on exit.
 */
final class LogbookThread implements AutoCloseable {
  private static final String NAME = "logbook";

  private final String place;
  private final ExecutorService executor = Executors.newSingleThreadExecutor(LogbookThread::named);

  LogbookThread(String place) {
    this.place = place;
  }

  private static Thread named(Runnable work) {
    Thread thread = new Thread(work, NAME);
    thread.setDaemon(true);
    return thread;
  }

  /**
   * Does work on the thread and waits for it; calls from several threads follow one another.
   *
   * @param work what to do; must not call back into this thread
   * @return what the work returned
   * @throws LogbookProblem of kind CLOSED after {@link #close}; else whatever the work throws
   */
  <T> T call(Supplier<T> work) {
    try {
      // join, unlike get, waits on when the caller is interrupted and leaves it marked so
      return CompletableFuture.supplyAsync(work, executor).join();
    } catch (RejectedExecutionException ended) {
      throw new LogbookProblem(ProblemKind.CLOSED, place, ended);
    } catch (CompletionException wrapped) {
      if (wrapped.getCause() instanceof RuntimeException thrown) {
        throw thrown;
      }
      if (wrapped.getCause() instanceof Error thrown) {
        throw thrown;
      }
      throw wrapped;
    }
  }

  /** Takes no more work; what was handed over before is finished, nothing is interrupted. */
  @Override
  public void close() {
    executor.shutdown();
  }
}
