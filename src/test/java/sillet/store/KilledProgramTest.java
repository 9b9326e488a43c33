package sillet.store;

import static org.assertj.core.api.Assertions.assertThat;
import static sillet.store.Refusals.refuses;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.visits.Reading;
import sillet.store.engine.ProblemKind;
import sillet.store.place.LogbookPlace;
import sillet.store.saving.ActionRow;

/**
 * A second program saves and is killed without warning right after it has said "saved"; nothing it
 * said so of may be missing, and nothing may be there by half.
 */
class KilledProgramTest {
  private static final int KILLS = 20;
  private static final int MOST_SAVES = 12;
  private static final long SEED = 1041;

  @TempDir private Path folder;

  @Test
  @Timeout(value = 5, unit = TimeUnit.MINUTES)
  void losesNothingThatWasCalledSaved() throws IOException, InterruptedException {
    LogbookPlace place = LogbookPlace.of(folder.resolve("logbook").toString());
    try (Logbook logbook = Logbook.create(place)) {
      logbook.perform(new AddInstrument(BenchDay.shortFifth()), BenchDay.TECHNICIAN);
      logbook.perform(new TakeIn(BenchDay.secondVisit()), BenchDay.TECHNICIAN);
    }
    Random random = new Random(SEED);
    long before = 2;
    for (int kill = 0; kill < KILLS; kill++) {
      long acknowledged = killAfter(1 + random.nextInt(MOST_SAVES), place);
      assertThat(acknowledged).isGreaterThan(before);
      before = assertWhole(place, acknowledged);
    }
  }

  /** Kills the child right after it has said "saved" so often; gives the last number it said. */
  private long killAfter(int saves, LogbookPlace place) throws IOException, InterruptedException {
    Process child = ChildProgram.start(SavingChild.class, place.file().toString());
    long last = 0;
    try (BufferedReader said = child.inputReader(StandardCharsets.UTF_8)) {
      int heard = 0;
      for (String line = said.readLine(); line != null; line = said.readLine()) {
        if (line.startsWith(SavingChild.SAVED)) {
          heard++;
          if (heard == saves) {
            // by the handle, for the process itself would also drop what it has said
            child.toHandle().destroyForcibly();
          }
          last = Long.parseLong(line.substring(SavingChild.SAVED.length()));
        }
      }
      assertThat(heard).as(errors(place)).isGreaterThanOrEqualTo(saves);
    } finally {
      child.destroyForcibly();
    }
    assertThat(child.waitFor()).as("killed, not ended").isNotZero();
    return last;
  }

  private static String errors(LogbookPlace place) throws IOException {
    return "errors of the child: " + Files.readString(Path.of(place.file() + ".errors"));
  }

  /** Everything acknowledged is there and whole; gives the number of the last action. */
  private static long assertWhole(LogbookPlace place, long acknowledged) {
    try (Logbook logbook = Logbook.open(place)) {
      List<ActionRow> rows = logbook.replay().recorded(0);
      assertThat(rows).hasSizeGreaterThanOrEqualTo((int) acknowledged);
      for (int i = 0; i < rows.size(); i++) {
        assertThat(rows.get(i).sequence()).isEqualTo(i + 1L);
      }
      List<Reading> readings =
          logbook.visits().byId(BenchDay.SECOND_VISIT_ID).orElseThrow().readings();
      int whole = BenchDay.readings().size();
      assertThat(readings).hasSize((rows.size() - 2) * whole);
      for (int i = 0; i < readings.size(); i++) {
        assertThat(readings.get(i)).isEqualTo(BenchDay.readings().get(i % whole));
      }
      return rows.size();
    }
  }

  @Test
  @Timeout(value = 2, unit = TimeUnit.MINUTES)
  void keepsASecondProgramOut() throws IOException, InterruptedException {
    LogbookPlace place = LogbookPlace.of(folder.resolve("logbook").toString());
    try (Logbook logbook = Logbook.create(place)) {
      logbook.perform(new AddInstrument(BenchDay.shortFifth()), BenchDay.TECHNICIAN);
      logbook.perform(new TakeIn(BenchDay.secondVisit()), BenchDay.TECHNICIAN);
    }
    Process child = ChildProgram.start(SavingChild.class, place.file().toString());
    try (BufferedReader said = child.inputReader(StandardCharsets.UTF_8)) {
      assertThat(said.readLine()).as(errors(place)).isEqualTo(SavingChild.OPEN);
      refuses(ProblemKind.IN_USE, () -> Logbook.open(place));
      refuses(ProblemKind.IN_USE, () -> Logbook.openOrCreate(place));
    } finally {
      child.destroyForcibly().waitFor();
    }
    Logbook.open(place).close();
  }
}
