package sillet.acoustics.pitch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;

@DisplayName("V2, V26, V33: cents")
class CentsTest {

  static List<Row> smallChanges() {
    return Tables.read("small-cents.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("smallChanges")
  @DisplayName("V2 cents of 1 Hz, V26 end correction, V33 tolerance of A4")
  void followsPublishedSmallChanges(Row row) {
    double share = row.number("change") / row.number("of");
    assertThat(Cents.ofSmallShare(share))
        .isCloseTo(row.number("cents"), within(row.number("tolerance")));
  }

  @Test
  void countsTwelveHundredToTheOctave() {
    assertThat(Cents.between(220, 440)).isCloseTo(1200, within(1e-12));
    assertThat(Cents.between(440, 220)).isCloseTo(-1200, within(1e-12));
    assertThat(Cents.toRatio(1200)).isCloseTo(2, within(1e-14));
  }

  @Test
  @DisplayName("the linear form is off by C x^2 / 2 (derived)")
  void boundsTheLinearForm() {
    double x = 0.01;
    assertThat(Cents.ofSmallShare(x) - Cents.ofRatio(1 + x))
        .isCloseTo(Cents.PER_UNIT * x * x / 2, within(1e-3));
  }

  @Test
  void hasNoCentsForNoSound() {
    assertThat(Cents.between(-1, 440)).isNaN();
  }
}
