package sillet.logbook.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;

class PitchTest {
  /**
   * Equal temperament on A4 = 440 Hz (ISO 16:1975); frequencies of physics handbooks, to 0.01 Hz,
   * from memory.
   */
  @ParameterizedTest
  @CsvSource({
    "A4,440",
    "E4,329.63",
    "B3,246.94",
    "G3,196.00",
    "D3,146.83",
    "A2,110.00",
    "E2,82.41",
    "F#3,185.00",
    "Bb2,116.54",
    "C4,261.63",
    "B0,30.87",
    "e2,82.41"
  })
  void knowsNotesByName(String note, double hz) {
    assertThat(Pitch.parse(note, 440).hz()).isCloseTo(hz, within(0.005));
  }

  @Test
  void readsHertzWithEitherSign() {
    assertThat(Pitch.parse("329,63", 440).hz()).isEqualTo(329.63);
    assertThat(Pitch.parse(" 82.41 ", 440).hz()).isEqualTo(82.41);
  }

  @Test
  void writesSharpsAndFlatsAsTyped() {
    assertThat(Pitch.parse("f\u266f3", 440).typed()).isEqualTo("F#3");
    assertThat(Pitch.parse("B\u266d2", 440).hz()).isEqualTo(Pitch.parse("A#2", 440).hz());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "E", "H2", "E#b4", "0", "-5", "E44", "quiet"})
  void refusesWhatIsNeitherNoteNorHertz(String typed) {
    assertThatThrownBy(() -> Pitch.parse(typed, 440))
        .isInstanceOfSatisfying(
            Rejection.class, r -> assertThat(r.reason().key()).isEqualTo("pitch.none"));
  }

  @Test
  void followsTheReferenceAndTheOffset() {
    assertThat(Pitch.parse("A3", 442).hz()).isEqualTo(221);
    // 1200 cents are an octave, by definition (A. J. Ellis, 1885)
    assertThat(Pitch.parse("A3", 440).shifted(-1200).hz()).isCloseTo(110, within(1e-9));
  }
}
