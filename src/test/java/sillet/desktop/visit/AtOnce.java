package sillet.desktop.visit;

import java.util.concurrent.Callable;
import java.util.function.Consumer;
import sillet.desktop.controls.Background;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.store.engine.LogbookProblem;

/** Background work that is done at once, for tests that look at one moment. */
public final class AtOnce implements Background {
  @Override
  public <T> void run(Callable<T> work, Consumer<? super T> done, Consumer<Message> failed) {
    T value;
    try {
      value = work.call();
    } catch (LogbookProblem problem) {
      failed.accept(problem.reason());
      return;
    } catch (Rejection rejection) {
      failed.accept(rejection.reason());
      return;
    } catch (Exception unexpected) {
      throw new AssertionError(unexpected);
    }
    done.accept(value);
  }
}
