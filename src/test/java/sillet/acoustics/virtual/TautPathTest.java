package sillet.acoustics.virtual;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class TautPathTest {
  @Test
  void goesStraightOverWhatIsLower() {
    TautPath path = TautPath.over(new double[] {0, 1, 2, 4}, new double[] {3, 1, -5, 0});
    assertThat(path.length()).isCloseTo(5, within(1e-12));
    assertThat(path.lastContact()).isZero();
  }

  @Test
  void bendsOverWhatIsHigher() {
    TautPath path = TautPath.over(new double[] {0, 3, 4, 6}, new double[] {0, 4, 1, 0});
    assertThat(path.length()).isCloseTo(10, within(1e-12));
    assertThat(path.lastStretch()).isCloseTo(5, within(1e-12));
    assertThat(path.lastContact()).isEqualTo(3);
  }
}
