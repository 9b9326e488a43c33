package sillet.acoustics.pitch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.acoustics.tables.Notes;

@DisplayName("Equal temperament")
class EqualTemperamentTest {

  @ParameterizedTest(name = "MIDI {0} = {1} Hz")
  @DisplayName("notes as the regression table has them (derived)")
  @CsvSource({"64, 329.6276", "55, 195.9977", "40, 82.4069"})
  void placesNotes(int midi, double hz) {
    assertThat(Notes.hz(midi)).isCloseTo(hz, within(5e-5));
  }

  @Test
  void followsAnyReferencePitch() {
    assertThat(EqualTemperament.frequency(-12, 415)).isCloseTo(207.5, within(1e-12));
  }

  @Test
  void goesOnBeyondItsTable() {
    assertThat(EqualTemperament.ratio(60)).isEqualTo(32);
    assertThat(EqualTemperament.ratio(-12)).isEqualTo(0.5);
  }

  @Test
  void refusesAReferenceThatIsNoPitch() {
    assertThatThrownBy(() -> EqualTemperament.frequency(0, 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> EqualTemperament.frequency(0, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
