package sillet.acoustics.neck;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;

@DisplayName("Clearances over the frets")
class ClearancesTest {

  @Test
  @DisplayName("c = (h12 - h1) / 0.44387, b = h1 - 0.05613 c over a straight neck (derived)")
  void findsTheHeightsAtTheEnds() {
    Clearances straight = new Clearances(2e-3, 0.5e-3, 0);
    double rise = 1.5e-3 / 0.44387;
    assertThat(straight.rise(15)).isCloseTo(rise, within(1e-7));
    assertThat(straight.atNut(15)).isCloseTo(0.5e-3 - 0.05613 * rise, within(5e-8));
  }

  @Test
  void comesBackFromTheHeightsAtTheEnds() {
    Clearances straight = Clearances.overStraightNeck(0.5e-3, 2.5e-3);
    assertThat(straight.atTwelve()).isCloseTo(1.75e-3, within(1e-15));
    assertThat(straight.rise(15)).isCloseTo(2.5e-3, within(1e-15));
    assertThat(straight.atNut(15)).isCloseTo(0.5e-3, within(1e-15));
  }

  @Test
  void bowsBetweenFretOneAndTheBodyJoint() {
    Clearances bowed = new Clearances(2e-3, 0.5e-3, 0.3e-3);
    assertThat(bowed.bowAt(1, 15)).isZero();
    assertThat(bowed.bowAt(15, 15)).isZero();
    assertThat(bowed.bowAt(20, 15)).isZero();
    assertThat(bowed.bowAt(6, 15)).isBetween(0.28e-3, 0.3e-3);
    assertThat(bowed.bowAt(12, 15)).isBetween(0.05e-3, 0.28e-3);
  }

  @Test
  void takesTheBowOutOfTheMeasuredClearance() {
    Clearances bowed = new Clearances(2e-3, 0.5e-3, 0.3e-3);
    double line = bowed.atNut(15) + bowed.rise(15) / 2;
    assertThat(line + bowed.bowAt(12, 15)).isCloseTo(2e-3, within(1e-15));
  }

  @Test
  @DisplayName("usual heights are higher on nylon (common practice, no source)")
  void reckonsWithUsualHeights() {
    assertThat(Clearances.usual(Construction.PLAIN_STEEL))
        .isEqualTo(Clearances.usual(Construction.WOUND_BRONZE));
    assertThat(Clearances.usual(Construction.WOUND_NYLON).atTwelve())
        .isGreaterThan(Clearances.usual(Construction.WOUND_STEEL).atTwelve());
  }
}
