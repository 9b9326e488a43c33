package sillet.acoustics.wire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.acoustics.tables.Notes;

/**
 * Common practice, no source: strings of one make, tuned in fourths at equal tension, go up in
 * gauge by 4/3: 45, 60, 80, 106.7, 142 thousandths of an inch. The reason is that unit mass goes
 * with the square of the gauge and tension with mass times the square of the pitch.
 */
@DisplayName("Gauges in fourths (common practice, no source)")
class EqualTensionGaugesTest {

  private static final double INCH = 0.0254;
  private static final double SCALE = 0.864;
  private static final double FIRST_GAUGE = 0.045;
  private static final int FOURTH = 5;

  @ParameterizedTest(name = "{0} fourths down: {1} thousandths")
  @CsvSource({"0, 45", "1, 60", "2, 80", "3, 106.7", "4, 142"})
  void goesUpInGaugeByFourThirds(int fourths, double thousandths) {
    double hz = Notes.hz(43 - FOURTH * fourths);
    double unitMass = tension(FIRST_GAUGE, Notes.hz(43)) / speedSquared(hz);
    assertThat(1000 * gaugeOf(unitMass)).isCloseTo(thousandths, within(1.0));
  }

  /** The gauge of the same make that weighs so much, by the mass of a plain string. */
  private static double gaugeOf(double unitMass) {
    return FIRST_GAUGE * Math.sqrt(unitMass / unitMass(FIRST_GAUGE));
  }

  @ParameterizedTest(name = "{1} thousandths pull as hard as 45 (within 2 %)")
  @CsvSource({"1, 60", "2, 80", "3, 106.7", "4, 142"})
  void pullsAlikeOnEveryString(int fourths, double thousandths) {
    double lower = tension(thousandths / 1000, Notes.hz(43 - FOURTH * fourths));
    double first = tension(FIRST_GAUGE, Notes.hz(43));
    assertThat(lower / first).isCloseTo(1, within(0.02));
  }

  private static double tension(double gauge, double hz) {
    return unitMass(gauge) * speedSquared(hz);
  }

  private static double unitMass(double gauge) {
    StringSpec plain = StringSpec.of(gauge * INCH, Construction.PLAIN_STEEL);
    return StringEstimate.of(plain, 50, SCALE).unitMass();
  }

  private static double speedSquared(double hz) {
    return 4 * SCALE * SCALE * hz * hz;
  }
}
