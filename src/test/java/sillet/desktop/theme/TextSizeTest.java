package sillet.desktop.theme;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class TextSizeTest {
  @Test
  void oneEmIsFourteenPixelsAtTheUsualSize() {
    assertThat(TextSize.USUAL.emPx()).isEqualTo(14);
    assertThat(new TextSize(150).emPx()).isEqualTo(21);
  }

  @Test
  void growsAndShrinksWithinItsEnds() {
    assertThat(TextSize.USUAL.larger().percent()).isEqualTo(110);
    assertThat(TextSize.USUAL.smaller()).isEqualTo(TextSize.USUAL);
    assertThat(new TextSize(195).larger().percent()).isEqualTo(200);
    assertThat(TextSize.nearest(20)).isEqualTo(TextSize.USUAL);
  }

  @Test
  void refusesASizeOutsideItsEnds() {
    assertThatThrownBy(() -> new TextSize(99)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new TextSize(201)).isInstanceOf(IllegalArgumentException.class);
  }
}
