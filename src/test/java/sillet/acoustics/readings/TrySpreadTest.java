package sillet.acoustics.readings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The factor 1.25 and the rule of the larger spread: common practice, no source; computed here. */
class TrySpreadTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "3.1; 3.1; 0.5",
        "3.0 4.0; 3.5; 0.5", // own spread 0.7071/sqrt 2 is larger than 0.5/sqrt 2
        "3.0 3.1; 3.05; 0.353553",
        "3.1 2.8 3.3; 3.1; 0.360844", // 1.25 x 0.5/sqrt 3
        "1.0 3.0 6.0; 3.0; 1.816208", // 1.25 x 2.516611/sqrt 3
        "1 2 3 4; 2.5; 0.806872" // 1.25 x 1.290994/sqrt 4
      })
  void givesTheMedianAndItsStandardDeviation(String typed, double median, double sd) {
    double[] tries = Arrays.stream(typed.split(" ")).mapToDouble(Double::parseDouble).toArray();

    TrySpread spread = TrySpread.of(tries, 0.5);

    assertThat(spread.median()).isCloseTo(median, within(1e-9));
    assertThat(spread.sd()).isCloseTo(sd, within(1e-6));
  }

  @Test
  void neverClaimsLessThanTheMediansRealScatter() {
    Random random = new Random(7);
    for (int k = 1; k <= 9; k++) {
      double squares = 0;
      double claimed = 0;
      int rounds = 20_000;
      for (int round = 0; round < rounds; round++) {
        double[] tries = random.doubles(k).map(unused -> random.nextGaussian()).toArray();
        TrySpread spread = TrySpread.of(tries, 1);
        squares += spread.median() * spread.median();
        claimed += spread.sd() * spread.sd();
      }
      assertThat(Math.sqrt(claimed / rounds))
          .as("%d tries", k)
          .isGreaterThan(0.985 * Math.sqrt(squares / rounds));
    }
  }

  @Test
  void namesTheTryThatLiesApart() {
    assertThat(TrySpread.of(new double[] {3.1, 2.8, 9.0, 3.3}, 0.5).wildTry()).hasValue(2);
    assertThat(TrySpread.of(new double[] {-9.0, 2.8, 3.0}, 0.5).wildTry()).hasValue(0);
  }

  @Test
  void callsNoTryWildThatChanceExplains() {
    assertThat(TrySpread.of(new double[] {3.1, 2.8, 4.7}, 0.5).wildTry()).isEmpty();
    assertThat(TrySpread.of(new double[] {1, 3, 6, 8, 2}, 0.1).wildTry()).isEmpty();
  }

  @Test
  void callsNeitherOfTwoTriesWild() {
    assertThat(TrySpread.of(new double[] {0, 40}, 0.1).wildTry()).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
  void rejectsATryThatIsNoNumber(double bad) {
    assertThatThrownBy(() -> TrySpread.of(new double[] {1, bad}, 0.5))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
  void rejectsAStandardDeviationThatIsNotAboveZero(double bad) {
    assertThatThrownBy(() -> TrySpread.of(new double[] {1}, bad))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void rejectsNoTry() {
    assertThatThrownBy(() -> TrySpread.of(new double[0], 0.5))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
