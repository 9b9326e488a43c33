package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.FretReading;

class UnreadOctaveTest {
  private static final FretReading THREE = new FretReading(3, 1.0, 0.5);
  private static final FretReading FIVE = new FretReading(5, 2.0, 0.5);
  private static final FretReading SEVEN = new FretReading(7, 2.5, 0.5);

  /**
   * [D] Posterior of the same model and expectations programmed apart and minimised without
   * derivatives: fret 12 +4.5513 sd 1.7811 cents, saddle at -0.35059 mm, move 1.69051 mm, -2692.27
   * cents a metre. Sampling the posterior without linearising gives +4.58 sd 1.74.
   */
  @Test
  void givesTheKnownPosterior() {
    MoveEstimate estimate = solve(Strings.octave(Strings.thin(), SEVEN, THREE, FIVE));

    assertThat(estimate.cents12Before()).isCloseTo(4.5513, within(0.0002));
    assertThat(estimate.cents12Sd()).isCloseTo(1.7811, within(0.0005));
    assertThat(estimate.setbackNow()).isCloseTo(-0.35059e-3, within(2e-7));
    assertThat(estimate.saddleMove()).isCloseTo(1.69051e-3, within(2e-7));
    assertThat(estimate.centsPerMetre()).isCloseTo(-2692.27, within(0.05));
    double half = 1.959964 * 1.7811 / 2692.27;
    assertThat(estimate.saddleHigh()).isCloseTo(1.69051e-3 + half, within(1e-6));
    assertThat(estimate.cents12After()).isCloseTo(0, within(1e-5));
  }

  @Test
  void isMuchLessSureThanAReading() {
    MoveEstimate unread = solve(Strings.octave(Strings.thin(), THREE, FIVE, SEVEN));
    MoveEstimate read =
        solve(Strings.octave(Strings.thin(), THREE, FIVE, SEVEN, new FretReading(12, 4.5, 0.5)));

    assertThat(width(unread)).isGreaterThan(3 * width(read));
    assertThat(unread.saddleMove()).isBetween(read.saddleLow(), read.saddleHigh());
  }

  @Test
  void everyReadingMoreMakesItSurer() {
    double none = width(solve(Strings.octave(Strings.thin())));
    double one = width(solve(Strings.octave(Strings.thin(), FIVE)));
    double two = width(solve(Strings.octave(Strings.thin(), FIVE, SEVEN)));
    double beyond =
        width(solve(Strings.octave(Strings.thin(), FIVE, SEVEN, new FretReading(15, 6, 0.5))));

    assertThat(one).isLessThan(none);
    assertThat(two).isLessThan(one);
    assertThat(beyond).isLessThan(two);
  }

  /**
   * Nothing read: the saddle is expected where it belongs, 10 cents (sd) either way, and the nut.
   */
  @Test
  void nothingReadStopsNothing() {
    MoveEstimate estimate = solve(Strings.octave(Strings.thin()));

    assertThat(estimate.saddleMove()).isCloseTo(0, within(1e-8));
    assertThat(estimate.cents12Sd()).isBetween(10.0, 10.3);
    assertThat(width(estimate)).isGreaterThan(14e-3);
  }

  @Test
  void saysWhatACutMoveLeavesWithoutAReadingAtFretTwelve() {
    MoveTask task = Strings.octave(Strings.thin(), THREE, FIVE, SEVEN);

    assertThat(MoveSolver.cents12At(task, 0).orElseThrow()).isCloseTo(4.5513, within(0.0002));
    assertThat(MoveSolver.cents12At(task, 1.69051e-3).orElseThrow()).isCloseTo(0, within(0.001));
  }

  private static double width(MoveEstimate estimate) {
    return estimate.saddleHigh() - estimate.saddleLow();
  }

  private static MoveEstimate solve(MoveTask task) {
    return MoveSolver.solve(task).orElseThrow();
  }
}
