package sillet.desktop.visit.readings;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.logbook.units.Tries;

class CellTextTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {"3.1|3.1", "3,1 2,8 3,3|3.1/2.8/3.3", "3.1/2.8|3.1/2.8", "-2.6|-2.6", "+5|5"})
  void readsTriesWithDecimalCommaAndDot(String typed, String tries) {
    assertThat(CellText.of(typed).tries()).isEqualTo(Tries.parse(tries));
  }

  @Test
  void readsWhatStandsBeforeTheDividerOfATryNotYetTyped() {
    assertThat(CellText.of("3.1/").tries()).isEqualTo(Tries.parse("3.1"));
    assertThat(CellText.of("3.1 2.8 ").tries()).isEqualTo(Tries.parse("3.1/2.8"));
  }

  @Test
  void saysWhyItCannotReadAndKeepsWhatWasTyped() {
    CellText entry = CellText.of("31o");
    assertThat(entry.tries()).isNull();
    assertThat(entry.typed()).isEqualTo("31o");
    assertThat(entry.problem()).isNotNull();
    assertThat(entry.problem().values()).contains("31o");
  }

  @ParameterizedTest
  @CsvSource({
    "5.0, 1, +5.1",
    "5, -1, +4.9",
    "0.1, -1, 0.0",
    "0.1, -2, \u22120.1",
    "'', 1, +0.1",
    "5.25, 1, +5.35"
  })
  void movesByATenthOfACent(String typed, int tenths, String then) {
    assertThat(CellText.of(typed).stepped(tenths)).isEqualTo(then);
  }

  @Test
  void movesOnlyTheLastOfSeveralTries() {
    assertThat(CellText.of("2.6 2.8 3.3").stepped(1)).isEqualTo("2.6 2.8 3.4");
  }

  @Test
  void leavesWhatItCannotReadAlone() {
    assertThat(CellText.of("31o").stepped(1)).isEqualTo("31o");
  }
}
