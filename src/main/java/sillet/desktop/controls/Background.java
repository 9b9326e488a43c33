package sillet.desktop.controls;

import java.util.concurrent.Callable;
import java.util.function.Consumer;
import sillet.logbook.text.Message;

/**
 * Work on the logbook's own thread, one piece after the other, never interrupted: an interrupt
 * would close the database. The answer comes back on the window's thread.
 */
public interface Background {

  /**
   * Does a piece of work. Exactly one of the two consumers is called, on the window's thread.
   *
   * @param work what touches the logbook; it may throw what the store throws and a {@link
   *     sillet.logbook.text.Rejection}
   * @param done takes the answer
   * @param failed takes the sentence that says what went wrong and what to do; also called, after
   *     the window for the unexpected has shown, when the work broke in a way nobody foresaw
   */
  <T> void run(Callable<T> work, Consumer<? super T> done, Consumer<Message> failed);
}
