package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

/** The sheet that is shipped as an example is the main job without a window. */
class ExampleSheetTest {
  private static final String NECK = "templates/bench-sheet-neck-example.csv";

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

  @Test
  void tellsCausesApartAlongTheNeck() {
    Run run = Run.of("moves", NECK, "--aim", "neck");
    List<String> rows = run.out().lines().skip(1).toList();

    assertThat(run.code()).isZero();
    assertThat(run.err()).isEmpty();
    assertThat(rows).hasSize(6).allMatch(row -> row.contains("(demo)"));
    assertThat(rows.get(3)).contains(",nut-high;fret-7,", "its slot is high", "one-way");
    assertThat(rows.get(0)).contains(",fret-7,").doesNotContain("nut-high");
    assertThat(run.out())
        .doesNotContain("NaN")
        .isEqualTo(run.out().replaceAll("[^\\x00-\\x7F]", ""));
  }

  @Test
  void forecastsWhatTheStringsWillBe() {
    Run run = Run.of("forecast", NECK);
    List<String> rows = run.out().lines().skip(1).toList();

    assertThat(run.code()).isZero();
    assertThat(run.err()).isEmpty();
    assertThat(rows).hasSize(6);
    assertThat(rows.get(5))
        .contains("N now ->", "filed for .046, a .049", "Relief: ", "Intonation of");
    assertThat(run.out())
        .doesNotContain("NaN")
        .isEqualTo(run.out().replaceAll("[^\\x00-\\x7F]", ""));
  }
}
