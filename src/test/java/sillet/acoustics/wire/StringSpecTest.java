package sillet.acoustics.wire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

@DisplayName("What is known of a string")
class StringSpecTest {

  private final StringSpec wound = StringSpec.of(1.2e-3, Construction.WOUND_STEEL);

  @Test
  void refusesACoreAsThickAsTheString() {
    assertThatThrownBy(() -> wound.withCore(CoreShape.ROUND, 1.2e-3))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("does not fit");
  }

  @Test
  void refusesAHexagonWhoseCornersStickOut() {
    assertThat(wound.withCore(CoreShape.HEX, 1.03e-3).core()).isEqualTo(1.03e-3);
    assertThatThrownBy(() -> wound.withCore(CoreShape.HEX, 1.05e-3))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void allowsAPlainStringNoCoreButItself() {
    StringSpec plain = StringSpec.of(0.3e-3, Construction.PLAIN_STEEL);
    assertThat(plain.withCore(CoreShape.ROUND, 0.3e-3).core()).isEqualTo(0.3e-3);
    assertThatThrownBy(() -> plain.withCore(CoreShape.ROUND, 0.2e-3))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void refusesNumbersThatNoStringHas() {
    assertThatThrownBy(() -> StringSpec.of(0, Construction.PLAIN_GUT))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> StringSpec.of(Double.NaN, Construction.PLAIN_GUT))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> wound.withUnitMass(-1e-3))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new StringConstants(1e-3, Double.NaN, 1e-4, 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new StringConstants(0, 1e4, 1e-4, 0))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
