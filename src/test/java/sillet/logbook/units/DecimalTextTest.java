package sillet.logbook.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;

class DecimalTextTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "3.1 | 3.1 | 1",
        "3,1 | 3.1 | 1",
        "+5.0 | 5 | 1",
        "-2.6 | -2.6 | 1",
        "\u22122,6 | -2.6 | 1",
        ".010 | 0.01 | 3",
        ",010 | 0.01 | 3",
        "0,010 | 0.01 | 3",
        "648 | 648 | 0",
        "12. | 12 | 0",
        " 7 | 7 | 0",
        "1.234 | 1.234 | 3",
        "12,34 | 12.34 | 2",
      })
  void readsDotAndComma(String typed, double value, int decimals) {
    assertThat(DecimalText.parse(typed)).isEqualTo(new Decimal(value, decimals));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"", "x", "NaN", "Infinity", "1e5", "1.2.3", "1.234,5", "--1", "5 c", "0x1F", "１"})
  void refusesWhatIsNoPlainNumber(String typed) {
    assertThatThrownBy(() -> DecimalText.parse(typed))
        .isInstanceOfSatisfying(
            Rejection.class, r -> assertThat(r.reason().key()).isEqualTo("number.none"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"1,234", "-12,345", "647,700"})
  void refusesWhatCouldMeanTwoNumbers(String typed) {
    assertThatThrownBy(() -> DecimalText.parse(typed))
        .isInstanceOfSatisfying(
            Rejection.class, r -> assertThat(r.reason().key()).isEqualTo("number.ambiguous"));
  }

  @Test
  void refusesDigitsWithoutEndAtOnce() {
    assertThatThrownBy(() -> DecimalText.parse("1".repeat(100_000))).isInstanceOf(Rejection.class);
  }

  @Test
  void roundingAddsOneStepOverTheSquareRootOfTwelve() {
    // standard deviation of a uniform error of one step: step / sqrt(12), any statistics handbook
    assertThat(DecimalText.parse("5").roundingSd()).isCloseTo(0.288675, within(1e-6));
    assertThat(DecimalText.parse("5.0").roundingSd()).isCloseTo(0.0288675, within(1e-7));
  }
}
