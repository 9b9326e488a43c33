package sillet.desktop.shell;

import java.util.Objects;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import javafx.application.Platform;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import sillet.desktop.controls.Background;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.store.engine.LogbookProblem;

/**
 * The one thread on which the window lets work be done. It is never interrupted, since an interrupt
 * may close the database under everybody, and it keeps the program alive until its work is done, so
 * that a save under way is finished when the window is gone.
 */
final class WorkThread implements Background {
  private static final Logger LOG = LoggerFactory.getLogger(WorkThread.class);
  private static final int LONGEST_END_SECONDS = 60;

  private final ExecutorService thread =
      Executors.newSingleThreadExecutor(work -> new Thread(work, "sillet-work"));
  private final Consumer<Throwable> unexpected;

  /**
   * Starts with nothing to do.
   *
   * @param unexpected shows, on the window's thread, what nobody foresaw
   */
  WorkThread(Consumer<Throwable> unexpected) {
    this.unexpected = unexpected;
  }

  @Override
  public <T> void run(Callable<T> work, Consumer<? super T> done, Consumer<Message> failed) {
    if (thread.isShutdown()) {
      failed.accept(Message.of("shell.closing"));
      return;
    }
    thread.execute(new Piece<>(work, done, failed));
  }

  /** Takes no more work; what was asked for before is still done. */
  void finish() {
    thread.shutdown();
  }

  /** Waits until what was asked for is done, before the program ends. */
  void awaitEnd() {
    try {
      if (!thread.awaitTermination(LONGEST_END_SECONDS, TimeUnit.SECONDS)) {
        LOG.error("The program ended before its work was done");
      }
    } catch (InterruptedException asked) {
      Thread.currentThread().interrupt();
    }
  }

  private final class Piece<T> extends FutureTask<T> {
    private final Consumer<? super T> taker;
    private final Consumer<Message> failed;

    Piece(Callable<T> work, Consumer<? super T> taker, Consumer<Message> failed) {
      super(work);
      this.taker = taker;
      this.failed = failed;
    }

    @Override
    protected void done() {
      Platform.runLater(this::answer);
    }

    private void answer() {
      T value;
      try {
        value = get();
      } catch (ExecutionException failure) {
        report(Objects.requireNonNullElse(failure.getCause(), failure));
        return;
      } catch (InterruptedException impossible) {
        throw new IllegalStateException("a finished piece of work does not wait", impossible);
      }
      taker.accept(value);
    }

    private void report(Throwable trouble) {
      if (trouble instanceof LogbookProblem problem) {
        failed.accept(problem.reason());
      } else if (trouble instanceof Rejection rejection) {
        failed.accept(rejection.reason());
      } else {
        unexpected.accept(trouble);
        failed.accept(Message.of("shell.unexpected"));
      }
    }
  }
}
