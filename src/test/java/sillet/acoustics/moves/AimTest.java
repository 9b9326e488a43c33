package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Map;
import org.junit.jupiter.api.Test;

class AimTest {
  @Test
  void theNeckIsFretsOneToTwelveAlike() {
    assertThat(Aim.NECK.weights()).hasSize(12).containsEntry(1, 1.0).containsEntry(12, 1.0);
    assertThat(Aim.OCTAVE.weights()).containsOnlyKeys(12);
  }

  @Test
  void refusesFretsAndWeightsThatAreNone() {
    for (Map<Integer, Double> bad :
        java.util.List.<Map<Integer, Double>>of(
            Map.of(), Map.of(0, 1.0), Map.of(25, 1.0), Map.of(3, 0.0), Map.of(3, Double.NaN))) {
      assertThatThrownBy(() -> Aim.frets(bad)).isInstanceOf(IllegalArgumentException.class);
    }
  }
}
