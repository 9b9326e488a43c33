package sillet.acoustics.forecast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.Fretting;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.wire.StringConstants;

class CapoTest {
  private static final double SCALE = 0.648;
  private static final StringConstants LIMP = new StringConstants(4e-4, 0, 0, 0);
  private static final StringConstants PLAIN =
      new StringConstants(1.149542e-3, 29287.69, 3.412954e-4, 0.03);

  /** A string that neither stretches nor bends: the capo only takes another note for the zero. */
  @ParameterizedTest
  @CsvSource({"1, 1", "3, 5", "5, 7", "7, 12"})
  void countsALimpStringFromTheCapo(int fret, int above) {
    StringLie lie =
        StringLie.nominal(LIMP, 329.63, SCALE, new Clearances(1.75e-3, 4.5e-4, 1.5e-4))
            .withSaddleSetback(2e-3);
    FrettedPitch open = FrettedPitch.of(lie).orElseThrow();
    double expected = open.centsAgainstOpen(fret + above) - open.centsAgainstOpen(fret);
    assertThat(Capo.cents(lie, Fretting.USUAL, fret, above).orElseThrow())
        .isCloseTo(expected, within(0.03));
  }

  /** "Capo at 1 makes it better: slots too high", a sign of the trade [P]. */
  @Test
  void takesTheSharpnessOfAHighNutSlotAway() {
    StringLie high =
        StringLie.nominal(PLAIN, 195.9977, SCALE, new Clearances(1.9e-3, 9e-4, 1e-4))
            .withSaddleSetback(4e-3);
    double withoutCapo = FrettedPitch.of(high).orElseThrow().centsAgainstOpen(1);
    double withCapo = Capo.cents(high, Fretting.USUAL, 1, 1).orElseThrow();
    assertThat(withoutCapo).isGreaterThan(5);
    assertThat(withCapo).isLessThan(withoutCapo - 4);
  }

  /** Over a straight neck the string runs from the top of the fret to where it lay before. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 5, 7})
  void laysTheStringFromItsFretToTheSaddle(int fret) {
    StringLie lie =
        StringLie.nominal(PLAIN, 195.9977, SCALE, Clearances.overStraightNeck(5e-4, 2.5e-3));
    Clearances capoed = Capo.lie(lie, Fretting.USUAL, fret).clearances();
    int joint = Capo.fretting(Fretting.USUAL, fret).bodyJoint();
    assertThat(capoed.atNut(joint)).isCloseTo(0, within(1e-9));
    assertThat(capoed.rise(joint)).isCloseTo(3e-3, within(1e-9));
  }

  /** A parabola cut short is a parabola: the bow over half the way is a quarter as deep. */
  @Test
  void leavesLessBowAboveTheCapo() {
    Clearances open = new Clearances(1.75e-3, 4.5e-4, 2.0e-4);
    StringLie lie = StringLie.nominal(PLAIN, 195.9977, SCALE, open);
    assertThat(Capo.lie(lie, Fretting.USUAL, 5).clearances().relief()).isBetween(0.5e-4, 0.9e-4);
    assertThat(Capo.lie(lie, Fretting.USUAL, 12).clearances().relief()).isLessThan(0.1e-4);
  }

  @ParameterizedTest
  @ValueSource(ints = {0, 13})
  void refusesACapoWhereNoneGoes(int fret) {
    StringLie lie = StringLie.nominal(LIMP, 329.63, SCALE, new Clearances(1e-3, 4e-4, 0));
    assertThatThrownBy(() -> Capo.cents(lie, Fretting.USUAL, fret, 1))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
