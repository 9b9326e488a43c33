package sillet.acoustics.neck;

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
import sillet.acoustics.solve.RootSearch;
import sillet.acoustics.tables.Notes;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.ScrewThread;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

@DisplayName("V28: the rule of lengths and the full model")
class LinearRuleTest {

  private static final double SCALE = 0.648;
  private static final RootSearch SEARCH = new RootSearch(1e-10, 100);

  static List<Row> perTurn() {
    return Tables.read("cents-per-turn.csv");
  }

  @Test
  @DisplayName("V28 +5 cents at fret 12, 648 mm, M3: 1.8715 mm back, 3.743 turns [D]")
  void asksForTheTabledTurns() {
    double move = LinearRule.saddleMove(5, SCALE, 12);
    assertThat(move * 1e3).isCloseTo(1.8715, within(0.001));
    assertThat(ScrewThread.turns(move, ScrewThread.M3.pitch())).isCloseTo(3.743, within(0.001));
  }

  /**
   * Why a solver does not print the rule's 1.8715 mm: a string pushed back is retuned with more
   * tension, so it stretches and bends less at the fret, and reaches its octave sooner. The stiffer
   * the string, the more. Heights, core and alpha are the usual ones.
   */
  @ParameterizedTest(name = "{0} in {1}: {3} to {4} mm")
  @DisplayName("V28 the full model asks for less: +5 cents at fret 12 of 648 mm")
  @CsvSource({
    ".010, PLAIN_STEEL, 64, 1.855, 1.865",
    ".017, PLAIN_STEEL, 55, 1.840, 1.850",
    ".046, WOUND_STEEL, 40, 1.840, 1.850",
    ".046, WOUND_NICKEL, 40, 1.840, 1.850"
  })
  void asksForLessThanTheRule(
      double gauge, Construction construction, int midi, double least, double most) {
    double move = moveFor(5, usual(gauge, construction, midi)) * 1e3;
    assertThat(move).isBetween(least, most);
    assertThat(move).isLessThan(LinearRule.saddleMove(5, SCALE, 12) * 1e3);
  }

  @Test
  @DisplayName("without stretch and stiffness only lengths are left, in closed form (derived)")
  void isGeometryAloneForAStringThatNeitherStretchesNorBends() {
    StringLie lie = usual(.010, Construction.PLAIN_STEEL, 64);
    StringLie ideal =
        lie.withConstants(new StringConstants(lie.constants().unitMass(), 0, 0, 0))
            .withClearances(new Clearances(0, 0, 0));
    double ratio = Cents.toRatio(5);
    double move = moveFor(5, ideal);
    assertThat(move).isCloseTo(SCALE * (ratio - 1) / (2 * ratio - 1), within(1e-8));
    assertThat(move / LinearRule.saddleMove(5, SCALE, 12)).isCloseTo(1, within(5e-3));
  }

  @Test
  @DisplayName("heights that nobody measured change the move by less than 1 %")
  void hardlyDependsOnTheUsualHeights() {
    for (double gauge : new double[] {.010, .017}) {
      StringLie lie = usual(gauge, Construction.PLAIN_STEEL, gauge < .015 ? 64 : 55);
      double move = moveFor(5, lie);
      for (Clearances other :
          List.of(new Clearances(1.2e-3, 0.25e-3, 0), new Clearances(2.6e-3, 0.6e-3, 0.3e-3))) {
        assertThat(moveFor(5, lie.withClearances(other)) / move).isCloseTo(1, within(0.01));
      }
    }
  }

  @ParameterizedTest(name = "{0} mm")
  @MethodSource("perTurn")
  @DisplayName("cents per mm and per turn at fret 12, within rounding (derived)")
  void followsTheTableOfTurns(Row row) {
    double perMetre = -LinearRule.centsPerMetre(row.number("scale_mm") * 1e-3, 12);
    assertThat(perMetre / 1e3).isCloseTo(row.number("per_mm"), within(0.0006));
    for (String thread : List.of("M2.5", "M3", "M4", "#4-40", "#6-32", "#4-48")) {
      double perTurn = perMetre * ScrewThread.named(thread).orElseThrow().pitch();
      assertThat(perTurn).as(thread).isCloseTo(row.number(thread), within(0.0006));
    }
  }

  @ParameterizedTest(name = "fret {0}: {1}")
  @DisplayName("cents per mm by fret at 650 mm, within rounding (derived)")
  @CsvSource({
    "1, 0.158",
    "3, 0.504",
    "5, 0.892",
    "7, 1.327",
    "9, 1.816",
    "12, 2.663",
    "15, 3.671",
    "17, 4.447",
    "19, 5.318",
    "24, 7.990"
  })
  void growsUpTheNeck(int fret, double cents) {
    assertThat(LinearRule.centsPerMetre(0.650, fret) / 1e3).isCloseTo(-cents, within(0.0006));
  }

  @Test
  void movesTheNutAlikeForAllFrets() {
    assertThat(LinearRule.nutMove(1.336, SCALE) * 1e3).isCloseTo(0.5, within(0.0005));
  }

  @Test
  void refusesTheOpenStringAndNoScale() {
    assertThatThrownBy(() -> LinearRule.saddleMove(5, SCALE, 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> LinearRule.centsPerMetre(-1, 12))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static StringLie usual(double gauge, Construction construction, int midi) {
    double hz = Notes.hz(midi);
    StringSpec spec = StringSpec.of(gauge * 0.0254, construction);
    return StringLie.nominal(
        StringEstimate.of(spec, hz, SCALE), hz, SCALE, Clearances.usual(construction));
  }

  /** From where the saddle stands when fret 12 reads {@code cents} to where it reads none. */
  private static double moveFor(double cents, StringLie lie) {
    return setbackFor(0, lie) - setbackFor(cents, lie);
  }

  private static double setbackFor(double cents, StringLie lie) {
    return SEARCH
        .find(
            setback -> FrettedPitch.centsAgainstOpen(lie.withSaddleSetback(setback), 12) - cents,
            -0.03,
            0.03)
        .orElseThrow();
  }
}
