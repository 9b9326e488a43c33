package sillet.desktop.visit;

import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.function.Consumer;
import sillet.desktop.controls.Background;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.store.engine.LogbookProblem;

/** Background work that is done at once, for tests that look at one moment. */
public final class AtOnce implements Background {
  @Override
  public <T> void run(Callable<T> work, Consumer<? super T> done, Consumer<Message> failed) {
    FutureTask<T> task = new FutureTask<>(work);
    task.run();
    T value;
    try {
      value = task.get();
    } catch (ExecutionException trouble) {
      failed.accept(reason(trouble.getCause()));
      return;
    } catch (InterruptedException impossible) {
      throw new AssertionError(impossible);
    }
    done.accept(value);
  }

  private static Message reason(Throwable trouble) {
    if (trouble instanceof LogbookProblem problem) {
      return problem.reason();
    }
    if (trouble instanceof Rejection rejection) {
      return rejection.reason();
    }
    throw new AssertionError(trouble);
  }
}
