package sillet.acoustics.forecast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.CoreShape;
import sillet.acoustics.wire.StringSpec;

class StringLoadTest {
  private static final double INCH = 0.0254;
  private static final double SCALE = 0.648;
  private static final double E4 = EqualTemperament.frequency(-5, 440);
  private static final double E2 = EqualTemperament.frequency(-29, 440);

  /** Regression values of the full model on a scale of 648 mm, one end clamped [D]. */
  @ParameterizedTest
  @CsvSource({"0, 72.4231", "0.002, 72.8719"})
  void knowsTheTensionOfAPlainFirstString(double setback, double newtons) {
    StringLoad load = StringLoad.of(plain(.010, E4), setback).orElseThrow();
    // there E is 200 GPa and the string rises by 2.5 mm: 0.005 % together
    assertThat(load.tension()).isCloseTo(newtons, within(0.005));
  }

  /** Strength 2211 / d^0.145 MPa, Shigley table 10-4 [S2]: 2697 MPa at 0.254 mm. */
  @Test
  void saysWhatShareOfItsStrengthSteelCarries() {
    StringLoad load = StringLoad.of(plain(.010, E4)).orElseThrow();
    double breaking = 2697e6 * Math.PI / 4 * Math.pow(.010 * INCH, 2);
    assertThat(load.shareOfBreaking().orElseThrow())
        .isCloseTo(load.tension() / breaking, within(0.001));
  }

  @Test
  void claimsNoStrengthOfNylon() {
    Stringing nylon = new Stringing(StringSpec.of(7.1e-4, Construction.PLAIN_NYLON), E4, 0.65);
    assertThat(StringLoad.of(nylon).orElseThrow().shareOfBreaking()).isEmpty();
  }

  /** T = mu (2 L f)^2: four semitones down leave 2^(-8/12) of it; bending changes 0.5 %. */
  @Test
  void slackensWithTheSquareOfThePitch() {
    double now = StringLoad.of(plain(.010, E4)).orElseThrow().tension();
    double then = StringLoad.of(plain(.010, E4).tunedBy(-4)).orElseThrow().tension();
    assertThat(then / now).isCloseTo(Math.pow(2, -8 / 12.0), within(0.005));
  }

  @Test
  void followsTheReferencePitch() {
    double now = StringLoad.of(plain(.010, E4)).orElseThrow().tension();
    Stringing lower = plain(.010, E4).atReference(440, 432);
    assertThat(lower.openHz()).isCloseTo(E4 * 432 / 440, within(1e-9));
    assertThat(StringLoad.of(lower).orElseThrow().tension() / now)
        .isCloseTo(Math.pow(432 / 440.0, 2), within(0.001));
  }

  @Test
  void isLessSureOfATensionWhereTheCoreIsGuessed() {
    StringSpec guessed = StringSpec.of(.046 * INCH, Construction.WOUND_STEEL);
    double wide = StringLoad.of(new Stringing(guessed, E2, SCALE)).orElseThrow().tensionSd();
    StringSpec core = guessed.withCore(CoreShape.ROUND, .018 * INCH);
    double less = StringLoad.of(new Stringing(core, E2, SCALE)).orElseThrow().tensionSd();
    StringSpec weighed = core.withUnitMass(6.9e-3);
    double least = StringLoad.of(new Stringing(weighed, E2, SCALE)).orElseThrow().tensionSd();
    assertThat(wide).isGreaterThan(less);
    assertThat(less).isGreaterThan(least);
    assertThat(wide).isLessThan(0.05 * 90);
  }

  @Test
  void doesNotSolveAStringTooStiffForItsPitch() {
    Stringing rod = new Stringing(StringSpec.of(5e-3, Construction.PLAIN_STEEL), 1000, 0.05);
    assertThat(StringLoad.of(rod)).isInstanceOf(NotSolved.class);
  }

  @ParameterizedTest
  @CsvSource({
    "60, 60, SAME",
    "62.9, 60, SAME",
    "57.1, 60, SAME",
    "64, 60, HEAVIER",
    "56, 60, LIGHTER"
  })
  void feelsLighterOrHeavierBeyondFivePerCent(double tension, double against, Feel feel) {
    assertThat(Feel.of(tension, against)).isEqualTo(feel);
  }

  @Test
  void sumsThePullOnTheNeck() {
    NeckPull pull = NeckPull.of(List.of(70.0, 60.0, 70.0), List.of(80.0, 60.0, 80.0));
    assertThat(pull.change()).isCloseTo(20, within(1e-12));
    assertThat(pull.share()).isCloseTo(0.1, within(1e-12));
  }

  private static Stringing plain(double gauge, double hz) {
    return new Stringing(StringSpec.of(gauge * INCH, Construction.PLAIN_STEEL), hz, SCALE);
  }
}
