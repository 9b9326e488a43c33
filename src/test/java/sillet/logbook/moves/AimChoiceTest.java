package sillet.logbook.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.logbook.text.Rejection;
import sillet.logbook.text.Texts;

class AimChoiceTest {
  @ParameterizedTest
  @CsvSource({
    "octave, octave",
    "' NECK ', neck",
    "1 5 7 12:2, 1 5 7 12:2",
    "12:2.50 1:1, 1 12:2.5",
    "3:10 4:0.125, 3:10 4:0.125"
  })
  void isReadBackFromTheWordItIsStoredUnder(String typed, String word) {
    AimChoice aim = AimChoice.parse(typed);
    assertThat(aim.word()).isEqualTo(word);
    assertThat(AimChoice.parse(aim.word())).isEqualTo(aim);
  }

  @ParameterizedTest
  @CsvSource({
    "'', no fret is named",
    "everywhere, “everywhere” is no aim",
    "0 5, there is no fret 0",
    "25, there is no fret 25",
    "5:0, the weight of fret 5",
    "5:-1, the weight of fret 5",
    "5 5, fret 5 stands there twice",
    "5:x, “x”"
  })
  void saysWhatIsWrongWithAnAim(String typed, String said) {
    assertThatThrownBy(() -> AimChoice.parse(typed))
        .isInstanceOfSatisfying(
            Rejection.class,
            refused -> assertThat(Texts.english().say(refused.reason())).contains(said));
  }

  @Test
  void aimsAtOneFretOnlyByName() {
    assertThat(AimChoice.parse("12")).isNotEqualTo(AimChoice.OCTAVE);
    assertThat(AimChoice.parse("12").weights()).containsOnlyKeys(12);
  }
}
