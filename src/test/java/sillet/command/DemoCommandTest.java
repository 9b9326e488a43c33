package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import sillet.store.place.LogbookPlace;
import sillet.store.place.Surroundings;

class DemoCommandTest {
  @Test
  void printsMovesAndJobSheetOfTheDemoInstrument() {
    Run run = Run.of("demo");

    assertThat(run.code()).isZero();
    assertThat(run.out().lines().filter(row -> row.startsWith("Brindlemoor (demo)"))).hasSize(6);
    assertThat(run.out().lines().filter(row -> row.startsWith("1007,"))).hasSize(12);
    assertThat(run.out().lines().filter(String::isEmpty)).hasSize(1);
    assertThat(run.err().lines()).hasSize(2).allMatch(line -> line.startsWith("Demo, "));
  }

  @Test
  void runsInTheTerminalWhereThereIsNoDisplay() {
    Run run = Run.of();

    assertThat(run.code()).isZero();
    assertThat(run.out()).isEqualTo(Run.of("demo").out());
    assertThat(run.err()).startsWith("There is no display here").contains("To open the window");
  }

  @Test
  void opensTheWindowWhereThereIsADisplay() {
    List<LogbookPlace> opened = new ArrayList<>();
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    Terminal terminal = new Terminal(out, out, () -> false);
    Surroundings around = new Surroundings("Linux", Path.of("/nowhere"), Map.of());
    SilletCommand sillet = new SilletCommand(terminal, around, opened::add);

    assertThat(sillet.run()).isZero();
    assertThat(sillet.run("--logbook", "/nowhere/shop")).isZero();
    assertThat(sillet.run("frob")).isEqualTo(2);

    assertThat(opened)
        .containsExactly(
            LogbookPlace.usual(around), new LogbookPlace(Path.of("/nowhere/shop.mv.db")));
    assertThat(out.toString(StandardCharsets.UTF_8)).startsWith("Unmatched argument");
  }
}
