package sillet.acoustics.neck;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.tables.PublishedString;
import sillet.acoustics.wire.StringConstants;

@DisplayName("V7-V12: best setbacks")
class BestSetbacksTest {

  private static final int FRETS = 12;

  static List<PublishedString> published() {
    return PublishedString.all();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("published")
  @DisplayName("V7 optimum saddle and nut setbacks, V8 residual rms")
  void findsThePublishedOptimum(PublishedString string) {
    RatioModel model = model(string);
    Setbacks best = BestSetbacks.optimum(model, FRETS).orElseThrow();
    assertThat(best.saddle() * 1e3).isCloseTo(string.saddleMm(), within(0.010));
    assertThat(best.nut() * 1e3).isCloseTo(string.nutMm(), within(0.010));
    assertThat(BestSetbacks.rmsWithOpen(model, FRETS, best))
        .isCloseTo(string.row().number("rms_cents"), within(0.0015));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("published")
  @DisplayName("V9 closed-form setbacks")
  void comesNearInClosedForm(PublishedString string) {
    Setbacks closed = BestSetbacks.closedForm(model(string), FRETS, PublishedString.SCALE);
    assertThat(closed.saddle() * 1e3).isCloseTo(string.saddleMm(), within(0.020));
    assertThat(closed.nut() * 1e3).isCloseTo(string.nutMm(), within(0.010));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("published")
  @DisplayName("V10 rule of thumb against the optimum")
  void comesNearByTheRuleOfThumb(PublishedString string) {
    RatioModel model = model(string);
    Setbacks best = BestSetbacks.optimum(model, FRETS).orElseThrow();
    Setbacks thumb = BestSetbacks.ruleOfThumb(model);
    assertThat(thumb.saddle() * 1e3).isCloseTo(best.saddle() * 1e3, within(0.12));
    assertThat(thumb.nut() * 1e3).isCloseTo(best.nut() * 1e3, within(0.05));
  }

  @Test
  @DisplayName("V10 the default string: 1.887 / -0.353 by the rule, 1.820 / -0.378 at best")
  void comparesRuleAndOptimumForTheDefaultString() {
    RatioModel model = new RatioModel(51, 0.00236, 0.65, 1e-3, 4e-3, 0);
    Setbacks thumb = BestSetbacks.ruleOfThumb(model);
    Setbacks best = BestSetbacks.optimum(model, FRETS).orElseThrow();
    assertThat(thumb.saddle() * 1e3).isCloseTo(1.887, within(0.001));
    assertThat(thumb.nut() * 1e3).isCloseTo(-0.353, within(0.001));
    assertThat(best.saddle() * 1e3).isCloseTo(1.820, within(0.001));
    assertThat(best.nut() * 1e3).isCloseTo(-0.378, within(0.001));
  }

  @Test
  @DisplayName("V11 length curvature at fret 12")
  void bendsTheLengthByHeight() {
    assertThat(new RatioModel(51, 0.00236, 0.65, 1e-3, 4e-3, 0).heightCurvature(12))
        .isCloseTo(-0.17, within(0.01));
  }

  @Test
  @DisplayName("V12 mass-density term at fret 1, finger 10 mm behind")
  void thinsTheStringByStretching() {
    RatioModel deep = new RatioModel(51, 0.00236, 0.65, 1e-3, 4e-3, 10e-3);
    double stretch = deep.stretch(1, Setbacks.NONE);
    assertThat(600 * Math.log1p(stretch) / Math.log(2)).isCloseTo(0.04, within(0.003));
  }

  /** Printed pooled means of five sets [S]: 1.8 +- 0.4 and -0.38 +- 0.03 mm. */
  @Test
  @DisplayName("one saddle and nut for all strings of the five sets but the light one [S]")
  void sharesASaddleAmongStrings() {
    List<Setbacks> each =
        published().stream()
            .filter(string -> !string.set().equals("nylon light"))
            .map(string -> BestSetbacks.optimum(model(string), FRETS).orElseThrow())
            .toList();
    Setbacks common = Setbacks.mean(each);
    assertThat(common.saddle() * 1e3).isCloseTo(1.8, within(0.1));
    assertThat(common.nut() * 1e3).isCloseTo(-0.38, within(0.01));
  }

  @Test
  @DisplayName("sums of powers over frets 1 to 12 (derived)")
  void sumsThePowersOfTheFrets() {
    assertThat(BestSetbacks.powerSum(0, FRETS)).isEqualTo(12);
    assertThat(BestSetbacks.powerSum(1, FRETS)).isCloseTo(5.81715, within(5e-6));
    assertThat(BestSetbacks.powerSum(2, FRETS)).isCloseTo(3.86308, within(5e-6));
  }

  /**
   * The full model retunes the string when the saddle moves and so differs a little; 0.05 mm is
   * 0.13 cents at fret 12.
   */
  @ParameterizedTest(name = "{0}")
  @MethodSource("published")
  @DisplayName("the full model agrees with the published setbacks to 0.05 mm")
  void agreesWithTheFullModel(PublishedString string) {
    Setbacks best = BestSetbacks.optimum(SetbackCurve.of(lie(string)), FRETS).orElseThrow();
    assertThat(best.saddle() * 1e3).isCloseTo(string.saddleMm(), within(0.05));
    assertThat(best.nut() * 1e3).isCloseTo(string.nutMm(), within(0.05));
  }

  @Test
  void leavesNothingToGain() {
    RatioModel model = model(published().get(0));
    Setbacks best = BestSetbacks.optimum(model, FRETS).orElseThrow();
    double least = BestSetbacks.rmsWithOpen(model, FRETS, best);
    for (double step : new double[] {-2e-6, 2e-6}) {
      Setbacks saddle = new Setbacks(best.saddle() + step, best.nut());
      Setbacks nut = new Setbacks(best.saddle(), best.nut() + step);
      assertThat(BestSetbacks.rmsWithOpen(model, FRETS, saddle)).isGreaterThan(least);
      assertThat(BestSetbacks.rmsWithOpen(model, FRETS, nut)).isGreaterThan(least);
    }
  }

  @Test
  void saysThatThereIsNoBestPlaceForASilentString() {
    assertThat(BestSetbacks.optimum((fret, at) -> Double.NaN, FRETS)).isInstanceOf(NotSolved.class);
  }

  @Test
  void refusesTooFewFretsAndNoStrings() {
    RatioModel model = model(published().get(0));
    assertThatThrownBy(() -> BestSetbacks.optimum(model, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> Setbacks.mean(List.of())).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new RatioModel(51, 0.002, 0, 1e-3, 4e-3, 0))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static RatioModel model(PublishedString string) {
    return new RatioModel(
        string.kappa(),
        string.beta(),
        PublishedString.SCALE,
        PublishedString.AT_NUT,
        PublishedString.RISE,
        0);
  }

  /** The same string with a mass and a tension, one end clamped as in the paper. */
  private static StringLie lie(PublishedString string) {
    double delta = string.beta() * PublishedString.SCALE;
    StringConstants constants =
        new StringConstants(
            string.unitMass(),
            string.kappa() * string.tension(),
            delta * delta * string.tension(),
            0);
    Clearances clearances =
        Clearances.overStraightNeck(PublishedString.AT_NUT, PublishedString.RISE);
    return StringLie.nominal(constants, string.hz(), PublishedString.SCALE, clearances);
  }
}
