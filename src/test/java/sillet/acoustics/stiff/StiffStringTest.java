package sillet.acoustics.stiff;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.tables.PublishedString;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;

@DisplayName("V3, V4, V21: modes of a string")
class StiffStringTest {

  static List<PublishedString> published() {
    return PublishedString.all();
  }

  static List<Row> otherAuthor() {
    return Tables.read("woodhouse-2004.csv");
  }

  static List<Row> exact() {
    return Tables.read("exact-modes.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("published")
  @DisplayName("V3 open pitch from tension, mass and length")
  void soundsThePublishedNote(PublishedString string) {
    double hz = StiffString.hz(1, PublishedString.SCALE, string.tension(), string.unitMass(), 0, 0);
    assertThat(Cents.between(string.hz(), hz)).isCloseTo(0, within(1.5));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("otherAuthor")
  @DisplayName("V4 open pitch, other author")
  void soundsTheNoteOfAnotherTable(Row row) {
    double hz =
        StiffString.hz(1, 0.65, row.number("tension_n"), row.number("unit_mass_g_m") / 1000, 0, 0);
    assertThat(Cents.between(PublishedString.hz(row.text("string")), hz)).isCloseTo(0, within(7.0));
  }

  @ParameterizedTest(name = "beta {0}")
  @MethodSource("exact")
  @DisplayName("V21 one formula for all ends against the exact modes")
  void staysNearTheExactModes(Row row) {
    double beta = row.number("beta");
    double tolerance = beta <= 0.005 ? 0.005 : 0.04;
    assertThat(Cents.between(row.number("one_clamped"), share(beta, 1)))
        .isCloseTo(0, within(tolerance));
    assertThat(Cents.between(row.number("both_clamped"), share(beta, 2)))
        .isCloseTo(0, within(tolerance));
  }

  @Test
  void isExactForPinnedEnds() {
    assertThat(share(0.01, 0)).isCloseTo(ExactModes.pinned(0.01, 1), within(1e-15));
  }

  @Test
  void hasNoPitchWithoutTensionOrLength() {
    assertThat(StiffString.hz(1, 0.6, 0, 1e-3, 0, 1)).isNaN();
    assertThat(StiffString.hz(1, 0.002, 70, 1e-3, 0.0011, 2)).isNaN();
    assertThat(StiffString.bendingLength(1e-4, -1)).isNaN();
  }

  @Test
  void countsModesFromOne() {
    assertThatThrownBy(() -> StiffString.hz(0, 0.6, 70, 1e-3, 0, 1))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void refusesAnEndHeldMoreThanFully() {
    assertThatThrownBy(() -> new EndCondition(0, 1.1, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new EndCondition(Double.NaN, 1, 1))
        .isInstanceOf(IllegalArgumentException.class);
  }

  /** Fundamental of a string of length 1, tension 1, mass 1/4: the ideal one is 1. */
  private static double share(double beta, double alpha) {
    return StiffString.hz(1, 1, 1, 0.25, beta, alpha);
  }
}
