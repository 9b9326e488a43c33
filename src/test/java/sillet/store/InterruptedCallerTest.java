package sillet.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicBoolean;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.TakeIn;
import sillet.store.place.LogbookPlace;

/** H2 closes a database for good when the thread that works in it is interrupted. */
class InterruptedCallerTest {
  private static final int SAVES = 40;

  @TempDir private Path folder;

  private Logbook logbookWithAVisit() {
    Logbook logbook = Logbook.create(LogbookPlace.of(folder.resolve("logbook").toString()));
    logbook.perform(new AddInstrument(BenchDay.shortFifth()), BenchDay.TECHNICIAN);
    logbook.perform(new TakeIn(BenchDay.secondVisit()), BenchDay.TECHNICIAN);
    return logbook;
  }

  private static void save(Logbook logbook) {
    logbook.perform(
        new RecordReadings(BenchDay.SECOND_VISIT_ID, BenchDay.readings()), BenchDay.TECHNICIAN);
  }

  @Test
  void savesForACallerWhoWasInterruptedAndLeavesTheMark() {
    try (Logbook logbook = logbookWithAVisit()) {
      Thread.currentThread().interrupt();
      save(logbook);
      assertThat(Thread.interrupted()).isTrue();
      save(logbook);
      assertThat(logbook.replay().recorded(0)).hasSize(4);
    }
  }

  @Test
  void outlivesInterruptsFromAllSides() throws InterruptedException {
    try (Logbook logbook = logbookWithAVisit()) {
      AtomicBoolean ended = new AtomicBoolean();
      List<Thread> callers = new ArrayList<>();
      for (int caller = 0; caller < 2; caller++) {
        callers.add(new Thread(() -> saveOften(logbook), "caller " + caller));
      }
      Thread disturber =
          new Thread(
              () -> {
                while (!ended.get()) {
                  callers.forEach(Thread::interrupt);
                }
              });
      callers.forEach(Thread::start);
      disturber.start();
      for (Thread caller : callers) {
        caller.join();
      }
      ended.set(true);
      disturber.join();
      assertThat(logbook.replay().recorded(0)).hasSize(2 + 2 * SAVES);
    }
  }

  private static void saveOften(Logbook logbook) {
    for (int i = 0; i < SAVES; i++) {
      save(logbook);
    }
  }
}
