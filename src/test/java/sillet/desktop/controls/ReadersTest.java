package sillet.desktop.controls;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import sillet.logbook.text.Rejection;

class ReadersTest {
  @Test
  void takesBothLimits() {
    assertThat(Readers.number("400", "480", "Hz").apply("400")).isEqualTo(400);
    assertThat(Readers.number("400", "480", "Hz").apply("480")).isEqualTo(480);
  }

  @Test
  void refusesWhatLiesOutside() {
    assertThatThrownBy(() -> Readers.number("400", "480", "Hz").apply("480.1"))
        .isInstanceOf(Rejection.class)
        .hasMessageContaining("field.between");
  }

  @Test
  void countsInWholeNumbers() {
    assertThat(Readers.whole(1, 24, "frets").apply(" 22 ")).isEqualTo(22);
    assertThatThrownBy(() -> Readers.whole(1, 24, "frets").apply("21.5"))
        .isInstanceOf(Rejection.class)
        .hasMessageContaining("field.whole");
  }

  @Test
  void takesTheBlanksFromWords() {
    assertThat(Readers.words().apply("  Quay Street ")).isEqualTo("Quay Street");
  }
}
