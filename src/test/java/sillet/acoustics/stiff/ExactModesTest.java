package sillet.acoustics.stiff;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;

@DisplayName("V21, V22: exact modes of a stiff string")
class ExactModesTest {

  static List<Row> roots() {
    return Tables.read("exact-modes.csv");
  }

  @ParameterizedTest(name = "beta {0}")
  @MethodSource("roots")
  @DisplayName("V21 exact eigenvalues")
  void findsTheRoots(Row row) {
    double beta = row.number("beta");
    assertThat(ExactModes.pinnedClamped(beta, 1).orElseThrow())
        .isCloseTo(row.number("one_clamped"), within(1e-11));
    assertThat(ExactModes.clamped(beta, 1).orElseThrow())
        .isCloseTo(row.number("both_clamped"), within(1e-9));
  }

  @ParameterizedTest(name = "beta {0}, mode {1}")
  @DisplayName("V22 half of a symmetric string is a string (derived, exact)")
  @CsvSource({"0.0005, 1", "0.002, 1", "0.002, 3", "0.005, 2", "0.01, 1", "0.01, 5", "0.05, 4"})
  void keepsTheSymmetryIdentities(double beta, int q) {
    assertThat(ExactModes.clamped(beta, 2 * q).orElseThrow())
        .isCloseTo(ExactModes.pinnedClamped(2 * beta, q).orElseThrow(), within(1e-9));
    assertThat(ExactModes.pinned(beta, 2 * q))
        .isCloseTo(ExactModes.pinned(2 * beta, q), within(1e-9));
  }

  @Test
  @DisplayName("approaches the published series, 1 + beta + (1 + q^2 pi^2 / 2) beta^2 [S]")
  void followsTheSeriesOfOneClampedEnd() {
    double beta = 0.002;
    for (int q = 1; q <= 4; q++) {
      double series = 1 + beta + (1 + q * q * Math.PI * Math.PI / 2) * beta * beta;
      double exact = ExactModes.pinnedClamped(beta, q).orElseThrow();
      assertThat(Cents.between(series, exact)).isCloseTo(0, within(0.005));
    }
  }

  @Test
  void holdsFromTheThinnestToTheThickestString() {
    for (double beta : new double[] {1e-5, 1e-4, 0.1, 1}) {
      double pinned = ExactModes.pinned(beta, 1);
      double one = ExactModes.pinnedClamped(beta, 1).orElseThrow();
      double both = ExactModes.clamped(beta, 1).orElseThrow();
      assertThat(pinned).isLessThan(one);
      assertThat(one).isLessThan(both);
    }
  }

  @Test
  void refusesWhatIsOutOfRange() {
    assertThatThrownBy(() -> ExactModes.clamped(1e-6, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> ExactModes.pinnedClamped(Double.NaN, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> ExactModes.pinned(0.01, 0))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
