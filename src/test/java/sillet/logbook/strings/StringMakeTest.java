package sillet.logbook.strings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import sillet.acoustics.wire.Construction;
import sillet.logbook.text.Rejection;

class StringMakeTest {
  @Test
  void refusesACoreAsThickAsAWoundString() {
    assertRejects("string.core-too-thick", Construction.WOUND_STEEL, .046, .046);
  }

  @Test
  void refusesAPlainStringWithAnotherCore() {
    assertRejects("string.core-of-plain", Construction.PLAIN_STEEL, .010, .009);
    assertThat(new StringMake(.010, Construction.PLAIN_STEEL, .010, null).coreIn()).isEqualTo(.010);
  }

  @Test
  void refusesAGaugeOfNothing() {
    assertThatThrownBy(() -> StringMake.of(0, Construction.PLAIN_STEEL))
        .isInstanceOf(Rejection.class);
    assertThatThrownBy(() -> StringMake.of(Double.NaN, Construction.PLAIN_STEEL))
        .isInstanceOf(Rejection.class);
  }

  @ParameterizedTest
  @EnumSource(Construction.class)
  void findsEveryConstructionByItsWord(Construction construction) {
    String word = ConstructionWords.of(construction);
    assertThat(ConstructionWords.find(" " + word + " ")).contains(construction);
    assertThat(word).matches("[a-z]+-[a-z]+");
  }

  private static void assertRejects(
      String key, Construction construction, double gaugeIn, double coreIn) {
    assertThatThrownBy(() -> new StringMake(gaugeIn, construction, coreIn, null))
        .isInstanceOfSatisfying(Rejection.class, r -> assertThat(r.reason().key()).isEqualTo(key));
  }
}
