package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class UsageTest {
  @Test
  void printsHelpAndVersionAsData() {
    Run help = Run.of("--help");
    Run moves = Run.of("moves", "--help");
    Run version = Run.of("--version");

    assertThat(help.code()).isZero();
    assertThat(help.out()).contains("moves").contains("repair shops");
    assertThat(moves.out()).contains("--aim", "--out", "bench sheet");
    assertThat(version.out()).startsWith("Sillet ");
    assertThat(help.err() + moves.err() + version.err()).isEmpty();
  }

  @Test
  void refusesBadUsageWithAHint() {
    for (Run run :
        new Run[] {
          Run.of("frob"),
          Run.of("moves"),
          Run.of("moves", "a.csv", "b.csv"),
          Run.of("moves", "a.csv", "--aim", "bridge"),
          Run.of("moves", "a.csv", "--logbook", "x"),
          Run.of("moves", "a.csv", "--out"),
          Run.of("sheet"),
          Run.of("sheet", "seven"),
          Run.of("history"),
          Run.of("demo", "--logbook", "x")
        }) {
      assertThat(run.code()).isEqualTo(2);
      assertThat(run.out()).isEmpty();
      assertThat(run.err().lines()).hasSize(2).anyMatch(line -> line.startsWith("Try: sillet"));
    }
  }
}
