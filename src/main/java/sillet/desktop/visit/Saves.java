package sillet.desktop.visit;

import java.time.Clock;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Background;
import sillet.desktop.controls.SaveSign;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.LogWork;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.WriteNote;
import sillet.logbook.text.Message;
import sillet.logbook.visits.VisitRecord;

/**
 * The actions of this page on their way to the disk, one after the other. One that fails stays at
 * the head of the row and keeps the others behind it: the next save, or the technician, tries it
 * again, and nothing is dropped.
 */
public final class Saves {
  private final Background background;
  private final SaveSign sign;
  private final Clock clock;
  private final Function<Action, VisitRecord> keep;
  private final Consumer<VisitRecord> kept;
  private final Deque<Action> waiting = new ArrayDeque<>();
  private boolean underWay;
  private @Nullable Message failure;

  /**
   * Saves for one visit.
   *
   * @param background does the work
   * @param sign says how it went
   * @param clock of the shop
   * @param keep does an action and tells what the logbook then holds of the visit; called off the
   *     window's thread
   * @param kept takes that
   */
  public Saves(
      Background background,
      SaveSign sign,
      Clock clock,
      Function<Action, VisitRecord> keep,
      Consumer<VisitRecord> kept) {
    this.background = background;
    this.sign = sign;
    this.clock = clock;
    this.keep = keep;
    this.kept = kept;
  }

  /** Sends an action on its way. */
  public void keep(Action action) {
    waiting.add(action);
    next();
  }

  /** Tries again what failed. */
  public void tryAgain() {
    next();
  }

  /** True while something is not on the disk. */
  public boolean pending() {
    return !waiting.isEmpty();
  }

  /** Why the last save failed; null if it did not. */
  public @Nullable Message failure() {
    return failure;
  }

  /** What is not on the disk, in a few words each, to be written down by hand. */
  public String written() {
    return waiting.stream().map(Saves::written).collect(Collectors.joining("; "));
  }

  private static String written(Action action) {
    if (action instanceof RecordReadings readings) {
      return readings.readings().stream()
          .map(
              one ->
                  one.string()
                      + "/"
                      + one.fret()
                      + ": "
                      + (one.tries() == null ? "" : one.tries().written()))
          .collect(Collectors.joining(", "));
    }
    if (action instanceof LogWork work) {
      return work.line().text();
    }
    return action instanceof WriteNote note ? note.note().text() : action.name();
  }

  private void next() {
    Action first = waiting.peek();
    if (underWay || first == null) {
      return;
    }
    underWay = true;
    background.run(() -> keep.apply(first), this::saved, this::failed);
  }

  private void saved(VisitRecord record) {
    underWay = false;
    failure = null;
    waiting.remove();
    sign.saved(clock.instant());
    kept.accept(record);
    next();
  }

  private void failed(Message why) {
    underWay = false;
    failure = why;
    sign.notSaved(why);
  }
}
