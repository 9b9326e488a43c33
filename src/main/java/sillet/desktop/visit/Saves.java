package sillet.desktop.visit;

import java.time.Clock;
import java.util.ArrayDeque;
import java.util.Collections;
import java.util.Deque;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Consumer;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Background;
import sillet.desktop.controls.SaveSign;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.LogWork;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.WriteNote;
import sillet.logbook.text.Message;
import sillet.logbook.visits.VisitRecord;

/**
 * The actions of this page on their way to the disk, one after the other. Each is handed on at
 * once, so that closing the logbook waits behind it. One that fails stays at the head of the row
 * and keeps the others behind it: the next save, or the technician, tries it again, and nothing is
 * dropped or done twice.
 */
public final class Saves {
  private final Background background;
  private final SaveSign sign;
  private final Clock clock;
  private final Consumer<Action> perform;
  private final Supplier<VisitRecord> read;
  private final Consumer<VisitRecord> kept;
  private final Deque<Action> waiting = new ArrayDeque<>();
  private final Set<Action> onDisk =
      Collections.synchronizedSet(Collections.newSetFromMap(new IdentityHashMap<>()));

  /** Set on the logbook's thread when an action fails, taken back in the window to try again. */
  private volatile boolean halted;

  /** Counts tries, so that what was sent before the last one does not overtake it. */
  private final AtomicInteger round = new AtomicInteger();

  private @Nullable Message failure;

  /**
   * Saves for one visit.
   *
   * @param background does the work
   * @param sign says how it went
   * @param clock of the shop
   * @param perform does an action; called off the window's thread
   * @param read tells what the logbook then holds of the visit; called off the window's thread
   * @param kept takes that
   */
  public Saves(
      Background background,
      SaveSign sign,
      Clock clock,
      Consumer<Action> perform,
      Supplier<VisitRecord> read,
      Consumer<VisitRecord> kept) {
    this.background = background;
    this.sign = sign;
    this.clock = clock;
    this.perform = perform;
    this.read = read;
    this.kept = kept;
  }

  /** Sends an action on its way. */
  public void keep(Action action) {
    waiting.add(action);
    if (failure == null) {
      send(action);
    } else {
      tryAgain();
    }
  }

  /** Tries again what failed. */
  public void tryAgain() {
    if (failure != null) {
      failure = null;
      round.incrementAndGet();
      halted = false;
      List.copyOf(waiting).forEach(this::send);
    }
  }

  /** True while moves that were made are not on the disk. */
  public boolean movesPending() {
    return waiting.stream().anyMatch(RecordMoves.class::isInstance);
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

  private void send(Action action) {
    int itsRound = round.get();
    background.run(
        () -> done(action, itsRound), found -> found.ifPresent(this::saved), this::failed);
  }

  /**
   * On the logbook's thread. Nothing overtakes an action that failed, and nothing is done twice.
   */
  private Optional<VisitRecord> done(Action action, int itsRound) {
    if (halted || itsRound != round.get()) {
      return Optional.empty();
    }
    halted = true;
    perform.accept(action);
    halted = false;
    onDisk.add(action);
    return Optional.of(read.get());
  }

  private void saved(VisitRecord record) {
    forgetWhatIsOnDisk();
    sign.saved(clock.instant());
    kept.accept(record);
  }

  private void failed(Message why) {
    forgetWhatIsOnDisk();
    if (waiting.isEmpty()) {
      // all is on the disk; only the page could not be read anew
      sign.saved(clock.instant());
    } else {
      failure = why;
      sign.notSaved(why);
    }
  }

  private void forgetWhatIsOnDisk() {
    waiting.removeIf(onDisk::contains);
  }
}
