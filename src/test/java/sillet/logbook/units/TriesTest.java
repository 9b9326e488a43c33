package sillet.logbook.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;

class TriesTest {
  @ParameterizedTest
  @ValueSource(strings = {"3.1 2.8 3.3", "3.1/2.8/3.3", "3,1/2,8/3,3", " 3.1  2.8 / 3.3 "})
  void takesTriesDividedBySpacesOrSlashes(String typed) {
    assertThat(Tries.parse(typed).values()).containsExactly(3.1, 2.8, 3.3);
  }

  @Test
  void writesThemWithTheDecimalsTyped() {
    assertThat(Tries.parse("+3.10 2 -0.5").written()).isEqualTo("3.10/2/-0.5");
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "/", "3.1/", "3.1//2.8", "3.1/x"})
  void refusesAnEmptyTry(String typed) {
    assertThatThrownBy(() -> Tries.parse(typed)).isInstanceOf(Rejection.class);
  }

  @Test
  void refusesMoreThanAHundredCents() {
    assertThat(Tries.parse("-100").values()).containsExactly(-100);
    assertThatThrownBy(() -> Tries.parse("100.1"))
        .isInstanceOfSatisfying(
            Rejection.class, r -> assertThat(r.reason().key()).isEqualTo("cents.too-far"));
  }

  @Test
  void roundsByTheFinestTry() {
    assertThat(Tries.parse("5 5.1").roundingSd()).isEqualTo(new Decimal(5.1, 1).roundingSd());
  }
}
