package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Plane geometry; thicknesses and edge: common practice, no source. */
class SaddleTopTest {
  @Test
  void keepsBreakPointsOffBothEdges() {
    SaddleTop top = SaddleTop.EIGHTH_INCH;
    assertThat(top.thickness()).isCloseTo(3.175e-3, within(1e-12));
    assertThat(top.holds(0.4e-3)).isTrue();
    assertThat(top.holds(0.39e-3)).isFalse();
    assertThat(top.holds(2.77e-3)).isTrue();
    assertThat(top.holds(2.78e-3)).isFalse();
    assertThat(top.beyond(3.0e-3)).isCloseTo(0.225e-3, within(1e-12));
    assertThat(top.beyond(1e-3)).isZero();
  }

  @Test
  void putsTheSaddleUnderAllBreakPoints() {
    SaddleTop top = SaddleTop.THREE_THIRTY_SECONDS;
    double front = top.frontEdgeFor(1.9e-3, 3.1e-3, 2.2e-3).orElseThrow();
    assertThat(1.9e-3 - front).isCloseTo(top.thickness() - (3.1e-3 - front), within(1e-12));
    assertThat(top.holds(1.9e-3 - front)).isTrue();
    assertThat(top.frontEdgeFor(1e-3, 2.7e-3)).isEmpty();
  }

  @Test
  void refusesASaddleThatIsAllEdge() {
    assertThatThrownBy(() -> new SaddleTop(0.8e-3, 0.4e-3))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
