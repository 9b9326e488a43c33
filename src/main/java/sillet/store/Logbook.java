package sillet.store;

import java.nio.file.Files;
import java.time.Clock;
import sillet.logbook.actions.Action;
import sillet.store.columns.ColumnTypes;
import sillet.store.engine.Engine;
import sillet.store.engine.Session;
import sillet.store.place.LogbookPlace;
import sillet.store.reading.InstrumentQueries;
import sillet.store.reading.PartsQueries;
import sillet.store.reading.ShopQueries;
import sillet.store.reading.StringSetQueries;
import sillet.store.reading.VisitQueries;
import sillet.store.saving.Replay;
import sillet.store.saving.Saved;
import sillet.store.saving.Saving;

/**
 * An open logbook. May be used from any thread: the work is done on a thread of the logbook's own,
 * one call after the other, and the caller waits; an interrupt of the caller never reaches the
 * database. Calls take as long as a disk takes, so a window calls from its background. Every call
 * may throw a {@link sillet.store.engine.LogbookProblem}.
 */
public final class Logbook implements AutoCloseable {
  private final Session session;
  private final Saving saving;

  private Logbook(Session session, Clock clock) {
    this.session = session;
    session.teach(ColumnTypes::teach);
    this.saving = new Saving(session, clock);
  }

  /**
   * Opens an existing logbook.
   *
   * @param place where it lies
   * @return the logbook, to be closed
   */
  public static Logbook open(LogbookPlace place) {
    return new Logbook(new Engine().open(place.file()), Clock.systemUTC());
  }

  /**
   * Makes an empty logbook and opens it.
   *
   * @param place where nothing lies yet; missing folders are made
   * @return the logbook, to be closed
   */
  public static Logbook create(LogbookPlace place) {
    return new Logbook(new Engine().create(place.file()), Clock.systemUTC());
  }

  /**
   * Opens the logbook of a place, or makes an empty one where nothing lies. Never puts an empty one
   * in the place of one that cannot be opened.
   *
   * @param place where it lies or shall lie
   * @return the logbook, to be closed
   */
  public static Logbook openOrCreate(LogbookPlace place) {
    return Files.exists(place.file()) ? open(place) : create(place);
  }

  /**
   * Makes an empty logbook in memory, gone when it is closed.
   *
   * @return the logbook, to be closed
   */
  public static Logbook inMemory() {
    return inMemory(Clock.systemUTC());
  }

  /**
   * Makes an empty logbook in memory.
   *
   * @param clock says when actions are saved
   * @return the logbook, to be closed
   */
  public static Logbook inMemory(Clock clock) {
    return new Logbook(new Engine().inMemory(), clock);
  }

  public String place() {
    return session.place();
  }

  /**
   * Does an action; when this returns, it is on the disk.
   *
   * @param action what to do
   * @param technician who does it
   * @return number and time
   */
  public Saved perform(Action action, String technician) {
    return saving.perform(action, technician);
  }

  public Saving saving() {
    return saving;
  }

  public Replay replay() {
    return new Replay(session, saving);
  }

  public ShopQueries shop() {
    return new ShopQueries(session);
  }

  public InstrumentQueries instruments() {
    return new InstrumentQueries(session);
  }

  public PartsQueries parts() {
    return new PartsQueries(session);
  }

  public StringSetQueries stringSets() {
    return new StringSetQueries(session);
  }

  public VisitQueries visits() {
    return new VisitQueries(session);
  }

  @Override
  public void close() {
    session.close();
  }
}
