package sillet.acoustics.sets;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import sillet.acoustics.forecast.StringLoad;
import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.sets.GaugeLadder.Rung;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.tables.Notes;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.CoreShape;
import sillet.acoustics.wire.StringSpec;

@DisplayName("Gauge ladder at equal tension")
class GaugeLadderTest {

  private static final double INCH = 0.0254;
  private static final double SCALE = 0.864;
  private static final int FOURTH = 5;

  /**
   * Common practice, no source: strings of one make in fourths at equal tension go up in gauge by
   * 4/3. Plain, so that the make is the same at every gauge; 1 % for stiffness [D].
   */
  @ParameterizedTest(name = "{0} fourths down from .009: {1} thousandths")
  @CsvSource({"1, 12", "2, 16", "3, 21.33"})
  void goesUpByFourThirdsInFourths(int fourths, double thousandths) {
    double wanted = StringLoad.of(plain(.009, 67)).orElseThrow().tension();

    Rung rung = GaugeLadder.rung(plain(.009, 67 - fourths * FOURTH), wanted).orElseThrow();

    assertThat(rung.exact() / INCH * 1000 / thousandths).isCloseTo(1, within(0.01));
    assertThat(rung.usual() / INCH * 1000).isCloseTo(thousandths, within(0.4));
  }

  @ParameterizedTest(name = "{0} in asks for itself")
  @CsvSource({".010", ".0135", ".017"})
  void findsTheGaugeItCameFrom(double gauge) {
    Stringing string = plain(gauge, 60);
    double tension = StringLoad.of(string).orElseThrow().tension();

    Rung rung = GaugeLadder.rung(string, tension).orElseThrow();

    assertThat(rung.exact()).isCloseTo(gauge * INCH, within(1e-8));
    assertThat(rung.usual()).isCloseTo(gauge * INCH, within(1e-9));
    assertThat(rung.miss()).isCloseTo(0, within(1e-6));
  }

  @Test
  void keepsWhatIsKnownOfCoreAndMass() {
    StringSpec known =
        StringSpec.of(.046 * INCH, Construction.WOUND_STEEL)
            .withCore(CoreShape.ROUND, .018 * INCH)
            .withUnitMass(7.2e-3);
    Stringing string = new Stringing(known, Notes.hz(40), 0.648);
    double tension = StringLoad.of(string).orElseThrow().tension();

    Rung same = GaugeLadder.rung(string, tension).orElseThrow();
    Rung lower = GaugeLadder.rung(string, 0.8 * tension).orElseThrow();

    assertThat(same.exact()).isCloseTo(.046 * INCH, within(1e-8));
    assertThat(lower.usual()).isLessThan(.046 * INCH);
    assertThat(lower.tension()).isCloseTo(0.8 * tension, within(0.05 * tension));
  }

  @Test
  void saysWhatTheNearestUsualGaugeMisses() {
    Rung rung = GaugeLadder.rung(plain(.013, 59), 78).orElseThrow();

    assertThat(rung.wanted()).isEqualTo(78);
    assertThat(rung.miss()).isCloseTo(rung.tension() - 78, within(1e-12));
    assertThat(Math.abs(rung.miss())).isLessThan(4);
  }

  @Test
  void doesNotReckonWoundNylonByGauge() {
    Stringing wound =
        new Stringing(StringSpec.of(.029 * INCH, Construction.WOUND_NYLON), Notes.hz(50), 0.65);

    assertThat(GaugeLadder.rung(wound, 70)).isInstanceOf(NotSolved.class);
  }

  @Test
  void refusesTensionsThatAreNone() {
    assertThatThrownBy(() -> GaugeLadder.rung(plain(.010, 64), 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> GaugeLadder.rung(plain(.010, 64), Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void isNotSolvedWhereNothingPullsThatHard() {
    assertThat(GaugeLadder.rung(plain(.010, 64), 1e7)).isInstanceOf(NotSolved.class);
  }

  @ParameterizedTest
  @EnumSource(Construction.class)
  void usualGaugesRise(Construction construction) {
    double[] gauges = UsualGauges.of(construction);

    double[] sorted = gauges.clone();
    Arrays.sort(sorted);
    assertThat(gauges).containsExactly(sorted).doesNotHaveDuplicates();
    assertThat(gauges.length == 0).isEqualTo(construction == Construction.WOUND_NYLON);
  }

  private static Stringing plain(double gauge, int midi) {
    return new Stringing(
        StringSpec.of(gauge * INCH, Construction.PLAIN_STEEL), Notes.hz(midi), SCALE);
  }
}
