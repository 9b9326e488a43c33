package sillet.acoustics.wire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;

@DisplayName("V31: strength of wire")
class WireStrengthTest {

  private static final double INCH = 0.0254;

  static List<Row> strengths() {
    return Tables.read("wire-strength.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("strengths")
  @DisplayName("V31 wire strength")
  void followsThePublishedFormulas(Row row) {
    double diameter = row.number("diameter_mm") * 1e-3;
    double pascals =
        switch (row.text("formula")) {
          case "shigley" -> WireStrength.shigley(diameter);
          case "en-sh" -> WireStrength.enStatic(diameter);
          case "en-dh" -> WireStrength.enDynamic(diameter);
          default -> throw new IllegalStateException(row.text("formula"));
        };
    assertThat(pascals / 1e6).isCloseTo(row.number("strength_mpa"), within(1.0));
  }

  @Test
  @DisplayName("a plain .010 at E4 on 648 mm carries about half of what breaks it (derived)")
  void sharesTheLoadOfAPlainString() {
    StringSpec plain = StringSpec.of(0.010 * INCH, Construction.PLAIN_STEEL);
    assertThat(WireStrength.breakingTension(plain).getAsDouble()).isCloseTo(136.7, within(0.1));
    assertThat(WireStrength.shareOfBreaking(plain, 0.648, 72.42).getAsDouble())
        .isCloseTo(0.53, within(0.005));
  }

  @Test
  void hangsAWoundStringOnItsCore() {
    StringSpec wound = StringSpec.of(0.046 * INCH, Construction.WOUND_NICKEL);
    StringSpec known = wound.withCore(CoreShape.ROUND, 0.018 * INCH);
    StringSpec bareCore = StringSpec.of(0.018 * INCH, Construction.PLAIN_STEEL);
    assertThat(WireStrength.breakingTension(known))
        .isEqualTo(WireStrength.breakingTension(bareCore));
    assertThat(WireStrength.breakingTension(wound)).isEmpty();
    assertThat(WireStrength.breakingTension(wound, 0.648).getAsDouble())
        .isCloseTo(WireStrength.breakingTension(known).getAsDouble(), within(5.0));
  }

  @Test
  void keepsSilentWhereNoFigureIsSound() {
    StringSpec nylon = StringSpec.of(0.7e-3, Construction.PLAIN_NYLON);
    assertThat(WireStrength.breakingTension(nylon)).isEmpty();
    assertThat(WireStrength.shareOfBreaking(nylon, 0.65, 70)).isEmpty();
    StringSpec wound = StringSpec.of(0.9e-3, Construction.WOUND_NYLON);
    assertThat(WireStrength.breakingTension(wound, 0.65)).isEmpty();
  }

  @Test
  void refusesAWireThatIsNone() {
    assertThatThrownBy(() -> WireStrength.shigley(0)).isInstanceOf(IllegalArgumentException.class);
  }
}
