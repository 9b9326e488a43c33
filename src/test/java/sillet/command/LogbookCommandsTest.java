package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.demo.DemoShop;

class LogbookCommandsTest {
  @TempDir static Path folder;
  private static Path logbook;

  @BeforeAll
  static void keepTheDemoShop() {
    logbook = DemoLogbook.in(folder);
  }

  @Test
  void printsTheJobSheetOfATicket() {
    Run run = Run.of("sheet", DemoShop.FINISHED_TICKET, "--logbook", logbook);

    assertThat(run.code()).isZero();
    assertThat(run.err()).isEmpty();
    assertThat(run.out().lines())
        .hasSize(13)
        .allMatch(row -> row.startsWith("ticket,") || row.startsWith("1007,"));
    assertThat(run.out()).contains("Within 1 cent: +3.9 before, +0.2 now.");
  }

  @Test
  void readsTheJobSheetBackAsABenchSheet() throws IOException {
    Run sheet = Run.of("sheet", DemoShop.OPEN_TICKET, "--logbook", logbook);
    Path file = Files.writeString(folder.resolve("job.csv"), sheet.out());

    Run moves = Run.of("moves", file);

    assertThat(moves.code()).isZero();
    assertThat(moves.out().lines()).hasSize(7).anyMatch(row -> row.contains(",away from neck,"));
  }

  @Test
  void knowsNoOtherTicket() {
    Run run = Run.of("sheet", 9, "--logbook", logbook);

    assertThat(run).isEqualTo(new Run(2, "", "There is no ticket 9 in this logbook.\n"));
  }

  @Test
  void printsTheHistoryByTicketSerialAndPartOfAName() {
    Run byName = Run.of("history", "lapw", "--logbook", logbook);

    assertThat(byName.code()).isZero();
    assertThat(byName.err()).isEmpty();
    assertThat(byName.out().lines()).hasSize(13);
    assertThat(byName.out().lines().skip(1).findFirst().orElseThrow()).startsWith("1042,");
    assertThat(Run.of("history", "d-0417", "--logbook", logbook)).isEqualTo(byName);
    assertThat(Run.of("history", "1007", "--logbook", logbook)).isEqualTo(byName);
    assertThat(Run.of("history", "Brindlemoor", "Lapwing", "--logbook", logbook)).isEqualTo(byName);
  }

  @Test
  void listsSeveralAndAsksWhichOne() {
    Run run = Run.of("history", "Brindlemoor", "--logbook", logbook);

    assertThat(run.code()).isEqualTo(2);
    assertThat(run.out()).isEmpty();
    assertThat(run.err().lines())
        .hasSize(3)
        .anyMatch(line -> line.contains("Lapwing, serial D-0417"))
        .anyMatch(line -> line.contains("Twelvefold, serial D-0077"))
        .anyMatch(line -> line.startsWith("More than one instrument"));
  }

  @Test
  void saysSoWhenNoInstrumentIsMeant() {
    Run run = Run.of("history", "@nobody's", "--logbook", logbook);

    assertThat(run.code()).isEqualTo(2);
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).startsWith("No instrument is known by").hasLineCount(1);
  }

  @Test
  void refusesALogbookThatIsNotThereOrNone() throws IOException {
    Path text = Files.writeString(folder.resolve("text.mv.db"), "no logbook at all");

    Run missing = Run.of("sheet", 1, "--logbook", folder.resolve("none"));
    Run semicolon = Run.of("sheet", 1, "--logbook", "a;b");
    Run damaged = Run.of("history", "x", "--logbook", text);

    assertThat(missing.code()).isEqualTo(2);
    assertThat(semicolon.code()).isEqualTo(2);
    assertThat(damaged.code()).isEqualTo(4);
    assertThat(missing.out() + semicolon.out() + damaged.out()).isEmpty();
    assertThat(missing.err() + semicolon.err() + damaged.err()).hasLineCount(3);
    assertThat(folder.resolve("none.mv.db")).doesNotExist();
    assertThat(text).hasContent("no logbook at all");
  }

  @Test
  void looksInTheUsualPlaceWithoutTheOption() {
    assertThat(Run.of("sheet", 1).err()).contains("/nowhere/.local/share/sillet/logbook.mv.db");
  }
}
