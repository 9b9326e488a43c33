package sillet.store.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static sillet.store.Refusals.refuses;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.store.BenchDay;
import sillet.store.Logbook;
import sillet.store.Tables;
import sillet.store.place.LogbookPlace;

class DamagedFileTest {
  private static final long SEED = 20250330;
  private static byte[] whole;
  private static int actions;

  @TempDir private Path folder;
  private Path file;

  @BeforeAll
  static void make(@TempDir Path folder) throws IOException {
    LogbookPlace place = LogbookPlace.of(folder.resolve("whole").toString());
    try (Logbook logbook = Logbook.create(place)) {
      BenchDay.actions().forEach(action -> logbook.perform(action, BenchDay.TECHNICIAN));
      actions = logbook.replay().recorded(0).size();
    }
    whole = Files.readAllBytes(place.file());
  }

  @BeforeEach
  void choose() {
    file = folder.resolve("logbook.mv.db");
  }

  private void staysAsItWasAndIsRefused(byte[] content) throws IOException {
    Files.write(file, content);
    LogbookPlace place = new LogbookPlace(file);
    refuses(ProblemKind.DAMAGED, () -> Logbook.open(place));
    refuses(ProblemKind.DAMAGED, () -> Logbook.openOrCreate(place));
    assertThat(Files.readAllBytes(file)).isEqualTo(content);
  }

  @Test
  void refusesAnEmptyFile() throws IOException {
    staysAsItWasAndIsRefused(new byte[0]);
  }

  @Test
  void refusesWhatIsNoDatabase() throws IOException {
    staysAsItWasAndIsRefused("no logbook".getBytes(StandardCharsets.UTF_8));
    staysAsItWasAndIsRefused("no logbook\n".repeat(5000).getBytes(StandardCharsets.UTF_8));
    byte[] noise = new byte[100_000];
    new Random(SEED).nextBytes(noise);
    staysAsItWasAndIsRefused(noise);
  }

  @Test
  void refusesADatabaseThatIsNoLogbook() throws IOException, SQLException {
    byte[] content = foreign("CREATE TABLE customer (id INTEGER)");
    staysAsItWasAndIsRefused(content);
  }

  private byte[] foreign(String sql) throws IOException, SQLException {
    Path other = folder.resolve("other.mv.db");
    try (var connection =
            java.sql.DriverManager.getConnection(
                "jdbc:h2:file:" + folder.resolve("other"), "sa", "");
        var statement = connection.createStatement()) {
      statement.execute(sql);
    }
    return Files.readAllBytes(other);
  }

  @Test
  void refusesALogbookFromWhichAnActionIsMissing() throws IOException, SQLException {
    Files.write(file, whole);
    Tables.execute(file, "DELETE FROM bench_check; DELETE FROM action WHERE sequence = 9");
    staysAsItWasAndIsRefused(Files.readAllBytes(file));
  }

  /** A cut end may be free space, then nothing is missing; nothing in between is allowed. */
  @Test
  void opensACutLogbookWholeOrNotAtAll() throws IOException {
    int refused = 0;
    for (int tenth = 0; tenth < 10; tenth++) {
      byte[] cut = Arrays.copyOf(whole, whole.length * tenth / 10);
      file = folder.resolve("cut-" + tenth + ".mv.db");
      Files.write(file, cut);
      try (Logbook logbook = Logbook.openOrCreate(new LogbookPlace(file))) {
        assertThat(logbook.replay().recorded(0)).hasSize(actions);
      } catch (LogbookProblem problem) {
        assertThat(problem.kind()).isEqualTo(ProblemKind.DAMAGED);
        assertThat(Files.readAllBytes(file)).isEqualTo(cut);
        refused++;
      }
    }
    assertThat(refused).isGreaterThan(2);
  }

  @Test
  void neverOpensAnEmptyLogbookOutOfABrokenOne() throws IOException {
    Random random = new Random(SEED);
    int refused = 0;
    for (int i = 0; i < 15; i++) {
      byte[] broken = whole.clone();
      int from = random.nextInt(broken.length);
      for (int at = from; at < Math.min(broken.length, from + 4096); at++) {
        broken[at] = (byte) random.nextInt();
      }
      file = folder.resolve("broken-" + i + ".mv.db");
      Files.write(file, broken);
      try (Logbook logbook = Logbook.openOrCreate(new LogbookPlace(file))) {
        assertThat(logbook.replay().recorded(0)).hasSize(actions);
      } catch (LogbookProblem problem) {
        assertThat(problem.kind()).isIn(ProblemKind.DAMAGED, ProblemKind.UNEXPECTED);
        refused++;
      }
    }
    assertThat(refused).isPositive();
  }

  @Test
  void refusesWhatANewerProgramWroteAndLeavesItAsItIs() throws IOException, SQLException {
    Files.write(file, whole);
    Tables.execute(
        file,
        "INSERT INTO \"flyway_schema_history\" SELECT \"installed_rank\" + 1, '999',"
            + " 'from the future', \"type\", 'V999__future.sql', 1, \"installed_by\","
            + " \"installed_on\", 1, TRUE FROM \"flyway_schema_history\""
            + " ORDER BY \"installed_rank\" DESC LIMIT 1");
    byte[] newer = Files.readAllBytes(file);
    refuses(ProblemKind.NEWER, () -> Logbook.openOrCreate(new LogbookPlace(file)));
    assertThat(Files.readAllBytes(file)).isEqualTo(newer);
  }

  @Test
  void refusesAFileFormatOfANewerDatabase() throws IOException {
    assertThat(new String(whole, 0, 4096, StandardCharsets.ISO_8859_1)).contains("format:3");
    byte[] newer = withFormat(9);
    Files.write(file, newer);
    refuses(ProblemKind.NEWER, () -> Logbook.open(new LogbookPlace(file)));
    assertThat(Files.readAllBytes(file)).isEqualTo(newer);
  }

  /** Both headers with another format, their checksums made anew as H2 reckons them. */
  private static byte[] withFormat(int format) {
    byte[] changed = whole.clone();
    for (int block = 0; block < 2; block++) {
      int start = block * 4096;
      String text = new String(changed, start, 4096, StandardCharsets.ISO_8859_1);
      String body =
          text.substring(0, text.indexOf(",fletcher:")).replace("format:3", "format:" + format);
      byte[] bytes = body.getBytes(StandardCharsets.ISO_8859_1);
      int sum = org.h2.mvstore.DataUtils.getFletcher32(bytes, 0, bytes.length);
      String line = body + ",fletcher:" + Integer.toHexString(sum) + "\n";
      Arrays.fill(changed, start, start + 4096, (byte) ' ');
      byte[] written = line.getBytes(StandardCharsets.ISO_8859_1);
      System.arraycopy(written, 0, changed, start, written.length);
    }
    return changed;
  }
}
