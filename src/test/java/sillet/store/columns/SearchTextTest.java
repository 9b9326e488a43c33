package sillet.store.columns;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SearchTextTest {
  @ParameterizedTest
  @CsvSource({
    "Maršálek, marsalek",
    "ÉTÉ, ete",
    "Straße, strasse",
    "Øre, ore",
    "Łódź, lodz",
    "ﬁne, fine",
    "'  two   words ', two words",
    "İstanbul, istanbul"
  })
  void foldsLettersToWhatAKeyboardHas(String text, String folded) {
    assertThat(SearchText.fold(text)).isEqualTo(folded);
  }

  @Test
  void foldsAlikeWhereverTheMachineStands() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("tr"));
      assertThat(SearchText.fold("TIGER")).isEqualTo("tiger");
    } finally {
      Locale.setDefault(before);
    }
  }

  @Test
  void knowsATelephoneNumberHoweverItIsDivided() {
    assertThat(SearchText.phone("+49 (151) 234/567-8")).isTrue();
    assertThat(SearchText.digits("+49 (151) 234/567-8")).isEqualTo("491512345678");
    assertThat(SearchText.phone("12")).isFalse();
    assertThat(SearchText.phone("A-0042")).isFalse();
    assertThat(SearchText.phone("---")).isFalse();
  }

  @Test
  void takesTheSignsOfAPatternAsTheyAre() {
    assertThat(SearchText.anywhere("50%_!")).isEqualTo("%50!%!_!!%");
  }
}
