package sillet.acoustics.neck;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.stiff.EndCondition;
import sillet.acoustics.stiff.ExactModes;
import sillet.acoustics.stiff.StiffString;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;
import sillet.acoustics.wire.StringConstants;

@DisplayName("V23, V24 and the full model")
class FrettedPitchTest {

  private static final double SCALE = 0.648;
  private static final Clearances STRAIGHT = Clearances.overStraightNeck(0.5e-3, 2.5e-3);

  static List<Row> regression() {
    return Tables.read("full-model.csv");
  }

  static List<Row> slopes() {
    List<Row> rows = Tables.read("full-model-slopes.csv");
    return rows.stream().filter(row -> !row.text("string").equals("rule")).toList();
  }

  static List<Row> octaves() {
    return Tables.read("octave-against-harmonic.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("regression")
  @DisplayName("regression table of the full model [D]")
  void followsTheRegressionTable(Row row) {
    FrettedPitch pitch = FrettedPitch.of(lie(row)).orElseThrow();
    assertThat(pitch.openTension()).isCloseTo(row.number("tension_n"), within(1e-4));
    double delta = StiffString.bendingLength(row.number("bending"), pitch.openTension());
    assertThat(delta * 1e3).isCloseTo(row.number("delta_mm"), within(1e-4));
    assertThat(row.number("axial") / pitch.openTension())
        .isCloseTo(row.number("kappa"), within(1e-3));
    for (int fret : new int[] {1, 3, 5, 7, 12}) {
      assertThat(pitch.centsAgainstOpen(fret))
          .as("fret " + fret)
          .isCloseTo(row.number("n" + fret), within(1e-4));
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("slopes")
  @DisplayName("regression table: cents per mm of saddle move [D]")
  void followsTheTabledSlopes(Row row) {
    Row string =
        regression().stream()
            .filter(r -> r.text("string").equals(row.text("string")))
            .findFirst()
            .orElseThrow();
    StringLie lie = lie(string);
    for (int fret : new int[] {1, 5, 7, 12}) {
      double farther = FrettedPitch.centsAgainstOpen(lie.withSaddleSetback(2.01e-3), fret);
      double nearer = FrettedPitch.centsAgainstOpen(lie.withSaddleSetback(1.99e-3), fret);
      assertThat((farther - nearer) / 0.02).isCloseTo(row.number("n" + fret), within(1e-4));
    }
  }

  @ParameterizedTest(name = "alpha {0}")
  @MethodSource("octaves")
  @DisplayName("V23 fretted 12 against the harmonic, V24 against twice the open string")
  void tellsTheTwoReferencesApart(Row row) {
    FrettedPitch pitch = FrettedPitch.of(withoutStretch(row.number("alpha"))).orElseThrow();
    assertThat(pitch.stretch(12)).isCloseTo(0, within(1e-15));
    assertThat(pitch.centsAgainstHarmonic(12))
        .isCloseTo(row.number("against_harmonic"), within(0.01));
    assertThat(pitch.centsAgainstOpen(12))
        .isCloseTo(row.number("against_twice_open"), within(0.01));
  }

  @Test
  @DisplayName("V23, V24 follow from the exact modes, too (one end clamped)")
  void agreesWithTheExactModes() {
    double beta = 0.00236;
    Row row = octaves().get(1);
    double fretted = ExactModes.pinnedClamped(2 * beta, 1).orElseThrow();
    double harmonic = ExactModes.pinnedClamped(beta, 2).orElseThrow();
    double open = ExactModes.pinnedClamped(beta, 1).orElseThrow();
    assertThat(Cents.between(harmonic, fretted))
        .isCloseTo(row.number("against_harmonic"), within(1e-3));
    assertThat(Cents.between(open, fretted))
        .isCloseTo(row.number("against_twice_open"), within(1e-3));
  }

  @Test
  @DisplayName("the references differ alike at every fret, the open string included")
  void shiftsTheHarmonicByOctaves() {
    FrettedPitch pitch = FrettedPitch.of(lie(regression().get(0))).orElseThrow();
    double apart = pitch.harmonicAgainstTwiceOpen();
    assertThat(apart).isGreaterThan(0);
    for (int fret = 0; fret <= 24; fret++) {
      assertThat(pitch.centsAgainstOpen(fret) - pitch.centsAgainstHarmonic(fret))
          .isCloseTo(apart, within(1e-9));
    }
  }

  @Test
  @DisplayName("stretch is gamma^2 h^2 / (2 (gamma - 1) X0^2) for the clearance h (derived)")
  void stretchesByTheClearance() {
    FrettedPitch pitch = FrettedPitch.of(lie(regression().get(0))).orElseThrow();
    assertThat(pitch.stretch(12)).isCloseTo(2 * 1.75e-3 * 1.75e-3 / SCALE / SCALE, within(1e-8));
    assertThat(pitch.stretch(0)).isZero();
  }

  @Test
  void stretchesMoreWhereTheNeckBowsAway() {
    StringLie lie = lie(regression().get(0));
    StringLie bowed = lie.withClearances(new Clearances(1.75e-3, 0.64e-3, 0.3e-3));
    StringLie flat = lie.withClearances(new Clearances(1.75e-3, 0.64e-3, 0));
    assertThat(FrettedPitch.centsAgainstOpen(bowed, 6))
        .isGreaterThan(FrettedPitch.centsAgainstOpen(flat, 6) + 0.1);
    // measured clearances at fret 12 are the same, so the stretch there is
    assertThat(FrettedPitch.centsAgainstOpen(bowed, 12))
        .isCloseTo(FrettedPitch.centsAgainstOpen(flat, 12), within(0.02));
  }

  @Test
  @DisplayName("a finger 10 mm behind the fret adds up to 0.6 cents at fret 1 (2024 paper [S])")
  void addsAFingersDepth() {
    StringConstants nylon = new StringConstants(5.05e-4, 48.7 * 52.0, 0, 0);
    Clearances model = Clearances.overStraightNeck(1e-3, 4e-3);
    StringLie lie = StringLie.nominal(nylon, 246.94, 0.65, model);
    double onTop = FrettedPitch.of(lie).orElseThrow().centsAgainstOpen(1);
    Fretting deep = new Fretting(1, 10e-3, 15);
    double behind = FrettedPitch.of(lie, deep).orElseThrow().centsAgainstOpen(1);
    assertThat(behind - onTop).isBetween(0.4, 0.9);
  }

  @Test
  void sharpensLessWhereTheStringSlips() {
    StringLie lie = lie(regression().get(0));
    double gripped = FrettedPitch.centsAgainstOpen(lie, 12);
    double slipping =
        FrettedPitch.of(lie, new Fretting(0.8, 0, 15)).orElseThrow().centsAgainstOpen(12);
    assertThat(slipping).isLessThan(gripped);
  }

  @Test
  @DisplayName("a nut 0.5 mm too far makes every note 1.3 cents sharp on 648 mm (derived)")
  void sharpensEveryNoteWithAFarNut() {
    StringLie lie = lie(regression().get(0));
    for (int fret : new int[] {1, 5, 12}) {
      double far = FrettedPitch.centsAgainstOpen(lie.withNutSetback(0.5e-3), fret);
      assertThat(far - FrettedPitch.centsAgainstOpen(lie, fret)).isCloseTo(1.336, within(0.04));
    }
  }

  @Test
  void saysThatNoTensionBringsARodToPitch() {
    StringConstants rod = new StringConstants(0.089, 2e6, 2.1, 0);
    StringLie lie = StringLie.nominal(rod, 20, 0.25, STRAIGHT);
    assertThat(FrettedPitch.of(lie)).isInstanceOf(NotSolved.class);
    assertThat(FrettedPitch.centsAgainstOpen(lie, 12)).isNaN();
    assertThat(FrettedPitch.centsAgainstHarmonic(lie, 12)).isNaN();
    StringLie noLength = lie(regression().get(0)).withSaddleSetback(-0.7);
    assertThat(FrettedPitch.of(noLength)).isInstanceOf(NotSolved.class);
  }

  @Test
  void refusesFretsAndLiesThatDoNotExist() {
    StringLie lie = lie(regression().get(0));
    assertThatThrownBy(() -> FrettedPitch.centsAgainstOpen(lie, -1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> FrettedPitch.centsAgainstHarmonic(lie, 49))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> lie.withSaddleSetback(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new Clearances(Double.NaN, 0, 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new Fretting(0, 0, 15)).isInstanceOf(IllegalArgumentException.class);
  }

  private static StringLie lie(Row row) {
    StringConstants string =
        new StringConstants(row.number("unit_mass"), row.number("axial"), row.number("bending"), 0);
    return new StringLie(
        string,
        row.number("open_hz"),
        SCALE,
        row.number("saddle_mm") * 1e-3,
        0,
        STRAIGHT,
        ends(row.number("alpha")));
  }

  /** Tension 70 N and the pitch that goes with it, beta 0.00236, string on the frets. */
  private static StringLie withoutStretch(double alpha) {
    double tension = 70;
    double unitMass = 4e-4;
    double delta = 0.00236 * SCALE;
    double hz = StiffString.hz(1, SCALE, tension, unitMass, delta, alpha);
    StringConstants string = new StringConstants(unitMass, 1e4, delta * delta * tension, 0);
    Clearances none = Clearances.overStraightNeck(0, 0);
    return new StringLie(string, hz, SCALE, 0, 0, none, ends(alpha));
  }

  private static EndCondition ends(double alpha) {
    double saddle = Math.max(0, alpha - 1);
    return new EndCondition(saddle, alpha - saddle, alpha - saddle);
  }
}
