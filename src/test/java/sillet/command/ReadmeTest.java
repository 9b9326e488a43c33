package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the README says of the sheets is what they are. */
class ReadmeTest {
  @TempDir Path folder;

  @Test
  void namesEveryColumnInItsOrder() throws IOException {
    Path logbook = DemoLogbook.in(folder);

    expectInOrder("**Moves**", Run.of("moves", "templates/bench-sheet-example.csv"));
    expectInOrder("**Job sheet**", Run.of("sheet", 1043, "--logbook", logbook));
    expectInOrder("**History**", Run.of("history", "lapwing", "--logbook", logbook));
  }

  private static void expectInOrder(String part, Run run) throws IOException {
    String readme = Files.readString(Path.of("README.md"));
    String header = run.out().lines().findFirst().orElseThrow();
    assertThat(header).contains(",");
    int at = readme.indexOf(part);
    for (String column : header.split(",", -1)) {
      int next = readme.indexOf('`' + column + '`', at);
      assertThat(next).as("%s of %s", column, part).isGreaterThan(at);
      at = next;
    }
  }
}
