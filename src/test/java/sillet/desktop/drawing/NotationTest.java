package sillet.desktop.drawing;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.desktop.drawing.Notation.Accidental;

class NotationTest {
  @ParameterizedTest
  @CsvSource({
    "F#3, F, SHARP, 3",
    "Bb2, B, FLAT, 2",
    "E4, E4, NATURAL, ''",
    "A, A, NATURAL, ''",
    "329.63, 329.63, NATURAL, ''",
    "'', '', NATURAL, ''",
    "bb2, bb2, NATURAL, ''"
  })
  void takesANoteApart(String typed, String letter, Accidental accidental, String rest) {
    assertThat(Notation.of(typed)).isEqualTo(new Notation(letter, accidental, rest));
  }
}
