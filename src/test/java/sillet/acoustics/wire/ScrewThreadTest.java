package sillet.acoustics.wire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;

@DisplayName("V27: screw threads")
class ScrewThreadTest {

  static List<Row> threads() {
    return Tables.read("screw-threads.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("threads")
  @DisplayName("V27 screw pitch")
  void hasTheStandardPitch(Row row) {
    ScrewThread thread = ScrewThread.named(row.text("designation")).orElseThrow();
    assertThat(thread.pitch() * 1e3).isCloseTo(row.number("pitch_mm"), within(1e-12));
  }

  @Test
  void knowsNoThreadThatTheTableLacks() {
    List<String> table = threads().stream().map(row -> row.text("designation")).toList();
    assertThat(ScrewThread.values()).extracting(ScrewThread::designation).hasSameElementsAs(table);
    assertThat(ScrewThread.named("M7")).isEmpty();
  }

  @Test
  void namesTheThreadOfAMeasuredPitch() {
    assertThat(ScrewThread.nearest(0.51e-3)).isEqualTo(ScrewThread.M3);
    assertThat(ScrewThread.nearest(0.45e-3)).isEqualTo(ScrewThread.M2_5);
    assertThat(ScrewThread.nearest(0.79e-3)).isEqualTo(ScrewThread.UNC_6_32);
    assertThat(ScrewThread.nearest(0.64e-3)).isEqualTo(ScrewThread.UNC_4_40);
  }

  @Test
  void countsTurnsWithTheSignOfTheMove() {
    assertThat(ScrewThread.turns(-1e-3, 0.5e-3)).isCloseTo(-2, within(1e-12));
  }

  @Test
  void refusesAPitchThatIsNone() {
    assertThatThrownBy(() -> ScrewThread.turns(1e-3, 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> ScrewThread.nearest(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
