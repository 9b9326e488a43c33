package sillet.desktop.drawing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.LimitLine.Values;

class LimitLineTest {
  @Test
  void limitsStandAtAThirdAndAtTwoThirds() {
    Values values = new Values(0.2, 0.3, null, null);
    assertThat(values.place(0.2)).isCloseTo(1 / 3.0, within(1e-9));
    assertThat(values.place(0.3)).isCloseTo(2 / 3.0, within(1e-9));
    assertThat(values.place(0.25)).isCloseTo(0.5, within(1e-9));
  }

  @Test
  void aFigureFarOutsideStaysOnTheLine() {
    Values values = new Values(0.2, 0.3, null, null);
    assertThat(values.place(9)).isEqualTo(0.94);
    assertThat(values.place(-9)).isEqualTo(0.06);
  }

  @Test
  void aLimitItselfIsInside() {
    Values values = new Values(0.2, 0.3, null, null);
    assertThat(values.outside(0.2)).isFalse();
    assertThat(values.outside(0.3)).isFalse();
    assertThat(values.outside(0.31)).isTrue();
  }

  @Test
  void oneLimitIsEnough() {
    Values atMost = new Values(null, 2.0, null, null);
    assertThat(atMost.outside(2.1)).isTrue();
    assertThat(atMost.outside(-5)).isFalse();
    assertThat(atMost.place(2.0)).isCloseTo(2 / 3.0, within(1e-9));
    Values atLeast = new Values(2.0, null, null, null);
    assertThat(atLeast.outside(1.9)).isTrue();
    assertThat(atLeast.place(2.0)).isCloseTo(1 / 3.0, within(1e-9));
  }
}
