package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.FretReading;

class UnreadOctaveTest {
  private static final FretReading THREE = new FretReading(3, 1.0, 0.5);
  private static final FretReading FIVE = new FretReading(5, 2.0, 0.5);
  private static final FretReading SEVEN = new FretReading(7, 2.5, 0.5);

  /** Three notes that rise as a saddle too near the neck makes them: 0.3 cents a fret at fret 7. */
  @Test
  void goesOnWhereTheReadingsPoint() {
    MoveEstimate estimate = solve(Strings.octave(Strings.thin(), SEVEN, THREE, FIVE));

    assertThat(estimate.cents12Before()).isBetween(4.0, 5.0);
    assertThat(estimate.cents12Sd()).isBetween(1.2, 2.0);
    assertThat(estimate.saddleMove()).isCloseTo(estimate.cents12Before() / 2692, within(1e-5));
    double half = 1.959964 * estimate.cents12Sd() / 2692.27;
    assertThat(estimate.saddleHigh() - estimate.saddleMove()).isCloseTo(half, within(0.02 * half));
    assertThat(estimate.cents12After()).isCloseTo(0, within(1e-5));
  }

  @Test
  void isMuchLessSureThanAReading() {
    MoveEstimate unread = solve(Strings.octave(Strings.thin(), THREE, FIVE, SEVEN));
    MoveEstimate read =
        solve(Strings.octave(Strings.thin(), THREE, FIVE, SEVEN, new FretReading(12, 4.5, 0.5)));

    assertThat(width(unread)).isGreaterThan(2 * width(read));
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

    MoveEstimate whole = solve(task);
    assertThat(task.cents12At(0).orElseThrow()).isCloseTo(whole.cents12Before(), within(1e-9));
    assertThat(task.cents12At(whole.saddleMove()).orElseThrow()).isCloseTo(0, within(1e-5));
  }

  private static double width(MoveEstimate estimate) {
    return estimate.saddleHigh() - estimate.saddleLow();
  }

  private static MoveEstimate solve(MoveTask task) {
    return task.solve().orElseThrow();
  }
}
