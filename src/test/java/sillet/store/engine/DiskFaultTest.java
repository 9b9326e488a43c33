package sillet.store.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static sillet.store.Refusals.refuses;

import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.h2.store.fs.FilePath;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.TakeIn;
import sillet.store.BenchDay;
import sillet.store.columns.ColumnTypes;
import sillet.store.reading.VisitQueries;
import sillet.store.saving.Saving;

/**
 * The disk fails at the first, second, third ... write until a run passes untouched, once and from
 * then on. Tests run as root, for whom no folder is read-only, so the faults come from a file
 * layer.
 */
class DiskFaultTest {
  private static final int SAVES = 3;
  private static final int MOST_CALLS = 200;
  private static final FaultyFiles LAYER = new FaultyFiles();

  @TempDir private Path folder;
  private Path file;
  private long acknowledged;

  @BeforeAll
  static void register() {
    FilePath.register(LAYER);
  }

  @AfterAll
  static void unregister() {
    FilePath.unregister(LAYER);
  }

  @BeforeEach
  void create() {
    file = folder.resolve("logbook.mv.db");
    try (Session session = taught(new Engine().create(file))) {
      Saving saving = new Saving(session, Clock.systemUTC());
      saving.perform(new AddInstrument(BenchDay.shortFifth()), "Ada Quill");
      acknowledged = saving.perform(new TakeIn(BenchDay.secondVisit()), "Ada Quill").sequence();
    }
  }

  @AfterEach
  void mend() {
    FaultyFiles.behave(FaultyFiles.Fault.NONE, 0);
  }

  private static Session taught(Session session) {
    session.teach(ColumnTypes::teach);
    return session;
  }

  @ParameterizedTest
  @EnumSource(names = {"ONCE", "FROM_THEN_ON", "SYNC_ONLY"})
  void losesNothingAndHalvesNothingWhenTheDiskFails(FaultyFiles.Fault fault) {
    Set<ProblemKind> seen = EnumSet.noneOf(ProblemKind.class);
    boolean untouched = false;
    int call = 0;
    while (!untouched) {
      call++;
      assertThat(call).as("calls until a run passes").isLessThan(MOST_CALLS);
      untouched = saveWithFault(fault, call, seen);
      everythingAcknowledgedIsThere();
    }
    assertThat(seen).isNotEmpty();
    assertThat(seen).isSubsetOf(ProblemKind.DISK, ProblemKind.NOT_CERTAIN, ProblemKind.CLOSED);
    assertThat(call).isGreaterThan(SAVES);
  }

  /** Saves with a fault to come; true if it never came. */
  private boolean saveWithFault(FaultyFiles.Fault fault, int call, Set<ProblemKind> seen) {
    boolean failed = false;
    Session session = taught(new Engine(FaultyFiles.PREFIX).open(file));
    Saving saving = new Saving(session, Clock.systemUTC());
    FaultyFiles.behave(fault, call);
    for (int i = 0; i < SAVES; i++) {
      try {
        acknowledged =
            saving
                .perform(
                    new RecordReadings(BenchDay.SECOND_VISIT_ID, BenchDay.readings()), "Ada Quill")
                .sequence();
      } catch (LogbookProblem problem) {
        seen.add(problem.kind());
        failed = true;
      }
    }
    boolean met = FaultyFiles.met();
    FaultyFiles.behave(FaultyFiles.Fault.NONE, 0);
    closeAsFarAsPossible(session, seen);
    return !failed && !met;
  }

  private static void closeAsFarAsPossible(Session session, Set<ProblemKind> seen) {
    try {
      session.close();
    } catch (LogbookProblem problem) {
      seen.add(problem.kind());
    }
  }

  private void everythingAcknowledgedIsThere() {
    try (Session session = taught(new Engine().open(file))) {
      List<Long> sequences =
          session.read(
              handle ->
                  handle
                      .createQuery("SELECT sequence FROM action ORDER BY sequence")
                      .mapTo(Long.class)
                      .list());
      List<Long> gapless = new ArrayList<>();
      for (long i = 1; i <= sequences.size(); i++) {
        gapless.add(i);
      }
      assertThat(sequences).isEqualTo(gapless);
      assertThat((long) sequences.size()).isGreaterThanOrEqualTo(acknowledged);
      var record = new VisitQueries(session).byId(BenchDay.SECOND_VISIT_ID).orElseThrow();
      int whole = BenchDay.readings().size();
      assertThat(record.readings()).hasSize((sequences.size() - 2) * whole);
      for (int i = 0; i < record.readings().size(); i++) {
        assertThat(record.readings().get(i)).isEqualTo(BenchDay.readings().get(i % whole));
      }
    }
  }

  @Test
  void callsNothingSavedOnceTheDiskDidNotTakeIt() {
    RecordReadings readings = new RecordReadings(BenchDay.SECOND_VISIT_ID, BenchDay.readings());
    try (Session session = taught(new Engine(FaultyFiles.PREFIX).open(file))) {
      Saving saving = new Saving(session, Clock.systemUTC());
      FaultyFiles.behave(FaultyFiles.Fault.SYNC_ONLY, 1);
      refuses(ProblemKind.NOT_CERTAIN, () -> saving.perform(readings, "Ada Quill"));
      FaultyFiles.behave(FaultyFiles.Fault.NONE, 0);
      refuses(ProblemKind.CLOSED, () -> saving.perform(readings, "Ada Quill"));
    }
    try (Session session = taught(new Engine(FaultyFiles.PREFIX).open(file))) {
      acknowledged =
          new Saving(session, Clock.systemUTC()).perform(readings, "Ada Quill").sequence();
    }
    everythingAcknowledgedIsThere();
  }

  @Test
  void saysThatAPlaceIsReadOnly() {
    FaultyFiles.behave(FaultyFiles.Fault.READ_ONLY, 0);
    refuses(ProblemKind.READ_ONLY, () -> new Engine(FaultyFiles.PREFIX).open(file));
    refuses(
        ProblemKind.READ_ONLY,
        () -> new Engine(FaultyFiles.PREFIX).create(folder.resolve("second.mv.db")));
    assertThat(folder.resolve("second.mv.db")).doesNotExist();
    FaultyFiles.behave(FaultyFiles.Fault.NONE, 0);
    everythingAcknowledgedIsThere();
  }

  @Test
  void leavesNothingBehindWhenTheDiskFailsWhileALogbookIsMade() {
    Path second = folder.resolve("second.mv.db");
    boolean made = false;
    int failures = 0;
    for (int call = 1; !made; call += 9) {
      assertThat(call).isLessThan(MOST_CALLS);
      FaultyFiles.behave(FaultyFiles.Fault.FROM_THEN_ON, call);
      try {
        new Engine(FaultyFiles.PREFIX).create(second).close();
        made = true;
      } catch (LogbookProblem problem) {
        assertThat(problem.kind()).isEqualTo(ProblemKind.DISK);
        assertThat(folder).isDirectoryNotContaining("glob:**{second,new-}*");
        failures++;
      }
    }
    assertThat(failures).isGreaterThan(2);
  }
}
