package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

class OctaveMoveTest {
  private static final double MM = 1e-3;

  /**
   * [D] 5 cents x 648 mm/1731.234 = 1.8715 mm is the length alone. Retuning the longer string
   * raises its tension, so stretch and stiffness fall, and the shorter string was steeper: the
   * whole model needs 0.8 % less on a thin plain string and 1.5 % less on thick ones. Solved
   * independently.
   */
  @ParameterizedTest
  @CsvSource({
    ".010, PLAIN_STEEL, 329.6276, 1.8563",
    ".017, PLAIN_STEEL, 195.9977, 1.8430",
    ".046, WOUND_NICKEL, 82.4069, 1.845"
  })
  void movesAStringFiveCentsSharp(double inch, Construction construction, double hz, double mm) {
    StringConstants constants =
        StringEstimate.of(StringSpec.of(inch * 0.0254, construction), hz, 0.648);
    StringLie lie = StringLie.nominal(constants, hz, 0.648, Clearances.usual(construction));

    MoveEstimate estimate = solve(Strings.octave(lie, new FretReading(12, 5.0, 0.5)));

    assertThat(estimate.saddleMove()).isCloseTo(mm * MM, within(0.004 * MM));
    double lengthAlone = 5 * 0.648 / Cents.PER_UNIT;
    assertThat(lengthAlone).isCloseTo(1.8715 * MM, within(0.0001 * MM));
    assertThat(estimate.saddleMove() / lengthAlone).isBetween(0.980, 0.995);
  }

  /** [D] The same three strings with the constants of table 2.8, solved independently. */
  @Test
  void agreesWithAnIndependentSolution() {
    assertThat(fiveSharp(Strings.thin()).saddleMove()).isCloseTo(1.856714e-3, within(1e-8));
    assertThat(fiveSharp(Strings.thick()).saddleMove()).isCloseTo(1.844212e-3, within(1e-8));
    assertThat(fiveSharp(Strings.wound()).saddleMove()).isCloseTo(1.844467e-3, within(1e-8));
    assertThat(fiveSharp(Strings.thin()).setbackNow()).isCloseTo(-0.460134e-3, within(1e-8));
  }

  /**
   * [D] Table 2.8: the .010 in string reads 3.7568 at fret 12 with the saddle at 0, -1.6157 at 2.
   */
  @Test
  void findsWhereTheSaddleStands() {
    MoveEstimate at0 = solve(Strings.octave(Strings.thin(), new FretReading(12, 3.7568, 0.1)));
    MoveEstimate at2 = solve(Strings.octave(Strings.thin(), new FretReading(12, -1.6157, 0.1)));

    assertThat(at0.setbackNow()).isCloseTo(0, within(3e-8));
    assertThat(at2.setbackNow()).isCloseTo(2e-3, within(3e-8));
    assertThat(at0.setbackNow() + at0.saddleMove())
        .isCloseTo(at2.setbackNow() + at2.saddleMove(), within(1e-8));
    assertThat(at2.saddleMove()).isNegative();
  }

  @Test
  void whereTheSaddleIsSaidToStandMakesNoDifference() {
    MoveEstimate one = fiveSharp(Strings.thick());
    MoveEstimate other = fiveSharp(Strings.thick().withSaddleSetback(9e-3));

    assertThat(other.saddleMove()).isCloseTo(one.saddleMove(), within(1e-8));
    assertThat(other.setbackNow()).isCloseTo(one.setbackNow(), within(1e-8));
  }

  @Test
  void otherFretsDoNotEnterWhereFretTwelveWasRead() {
    FretReading twelve = new FretReading(12, 5, 0.5);
    MoveEstimate alone = solve(Strings.octave(Strings.thin(), twelve));
    MoveEstimate more = solve(Strings.octave(Strings.thin(), new FretReading(5, -9, 0.1), twelve));

    assertThat(more.saddleMove()).isEqualTo(alone.saddleMove());
    assertThat(more.rmsBefore()).isGreaterThan(alone.rmsBefore());
  }

  @Test
  void addsTheVariancesOfReadingAndModel() {
    FretReading reading = new FretReading(12, 5, 0.3);
    MoveTask task =
        new MoveTask(Strings.thin(), List.of(reading), Reference.OPEN, Aim.OCTAVE, false);

    MoveEstimate estimate = solve(task);

    double sd = Math.hypot(0.3 / estimate.centsPerMetre(), 0.005 * estimate.saddleMove());
    assertThat(estimate.saddleHigh() - estimate.saddleMove()).isCloseTo(1.96 * sd, within(1e-7));
    assertThat(estimate.saddleMove() - estimate.saddleLow()).isCloseTo(1.96 * sd, within(1e-7));
    assertThat(estimate.cents12Sd()).isEqualTo(0.3);
    assertThat(estimate.cents12Before()).isEqualTo(5);
    assertThat(estimate.cents12After()).isCloseTo(0, within(1e-5));
    assertThat(estimate.nutMove()).isZero();
    // [D] d cents/ds of table 2.8 at s = 2: -2.6737 a millimetre, a little more nearer the neck
    assertThat(estimate.centsPerMetre()).isBetween(-2710.0, -2674.0);
  }

  @Test
  void saysWhatStaysWhenTheMoveIsCutToTheTravel() {
    MoveTask task = Strings.octave(Strings.thin(), new FretReading(12, 5, 0.5));
    double whole = solve(task).saddleMove();

    assertThat(left(task, 0)).isCloseTo(5, within(1e-5));
    assertThat(left(task, whole)).isCloseTo(0, within(1e-5));
    // [D] 1.0 mm takes 2.70 cents of 5
    assertThat(left(task, 1e-3)).isCloseTo(2.302, within(0.003));
    assertThat(left(task, -1e-3)).isGreaterThan(7.6);
  }

  /**
   * [M] The harmonic runs sharp of the octave by 1.5 C B cents, B = pi^2 EI/(T L^2); so a note true
   * to the open string is flat of the harmonic by that.
   */
  @Test
  void makesFretTwelveTrueAgainstTheReferenceItWasReadAgainst() {
    StringLie lie = Strings.wound();
    FretReading zero = new FretReading(12, 0, 0.1);
    MoveTask harmonic = new MoveTask(lie, List.of(zero), Reference.HARMONIC, Aim.OCTAVE, false);
    MoveEstimate estimate = solve(harmonic);

    assertThat(estimate.saddleMove()).isCloseTo(0, within(1e-8));
    StringLie now = lie.withSaddleSetback(estimate.setbackNow());
    double sharpness =
        1.5 * Cents.PER_UNIT * Math.PI * Math.PI * 4.289679e-4 / (86.5 * 0.648 * 0.648);
    assertThat(FrettedPitch.centsAgainstHarmonic(now, 12)).isCloseTo(0, within(1e-5));
    assertThat(FrettedPitch.centsAgainstOpen(now, 12)).isCloseTo(sharpness, within(0.01));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-100, -37, 0, 0.01, 42, 100})
  void solvesEveryReadingASheetMayHold(double cents) {
    for (StringLie lie : List.of(Strings.thin(), Strings.thick(), Strings.wound())) {
      MoveEstimate estimate = solve(Strings.octave(lie, new FretReading(12, cents, 0.5)));
      StringLie then = lie.withSaddleSetback(estimate.setbackNow() + estimate.saddleMove());
      assertThat(FrettedPitch.centsAgainstOpen(then, 12)).isCloseTo(0, within(1e-5));
      assertThat(estimate.saddleLow()).isLessThan(estimate.saddleMove());
      assertThat(estimate.saddleHigh()).isGreaterThan(estimate.saddleMove());
    }
  }

  @Test
  void doesNotSolveWhatNoSaddleExplains() {
    Outcome<MoveEstimate> outcome =
        Strings.octave(Strings.thin(), new FretReading(12, 5000, 0.5)).solve();

    assertThat(outcome).isInstanceOf(NotSolved.class);
  }

  @Test
  void doesNotSolveAStringThatNoTensionBringsToPitch() {
    StringLie rod = Strings.lie(new StringConstants(1e-3, 1e5, 1e3, 0), 30);
    FretReading reading = new FretReading(12, 5, 0.5);

    assertThat(Strings.octave(rod, reading).solve()).isInstanceOf(NotSolved.class);
    assertThat(Strings.octave(rod).solve()).isInstanceOf(NotSolved.class);
    assertThat(Strings.octave(rod, reading).cents12At(0)).isInstanceOf(NotSolved.class);
  }

  @Test
  void refusesAMoveThatIsNoNumber() {
    MoveTask task = Strings.octave(Strings.thin(), new FretReading(12, 5, 0.5));
    assertThatThrownBy(() -> task.cents12At(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
    assertThat(task.cents12At(-1)).isInstanceOf(NotSolved.class);
  }

  private static MoveEstimate fiveSharp(StringLie lie) {
    return solve(Strings.octave(lie, new FretReading(12, 5, 0.5)));
  }

  private static MoveEstimate solve(MoveTask task) {
    return task.solve().orElseThrow();
  }

  private static double left(MoveTask task, double move) {
    return task.cents12At(move).orElseThrow();
  }
}
