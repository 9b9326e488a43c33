package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

/** The sheet that is shipped as an example is the main job without a window. */
class ExampleSheetTest {
  @Test
  void givesAMoveForEveryString() {
    Run run = Run.of("moves", "templates/bench-sheet-example.csv");
    List<String> rows = run.out().lines().skip(1).toList();

    assertThat(run.code()).isZero();
    assertThat(run.err()).isEmpty();
    assertThat(rows).hasSize(10).allMatch(row -> row.contains("(demo)"));
    assertThat(rows.get(0)).contains(",away from neck,", ",move,");
    assertThat(rows.get(2)).contains(",no-room,");
    assertThat(rows.get(3)).contains(",leave,");
    assertThat(rows.get(5)).contains(",toward neck,");
  }
}
