package sillet.acoustics.forecast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.Fretting;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.wire.StringConstants;

class ActionChangeTest {
  private static final double SCALE = 0.648;

  /** Wound .046 in on a core of .018: the reference string of the full model [D]. */
  private static final StringConstants BASS =
      new StringConstants(7.635858e-3, 32834.64, 4.289679e-4, 0.04);

  private static final StringLie LIE =
      StringLie.nominal(BASS, 82.4069, SCALE, Clearances.overStraightNeck(5e-4, 2.5e-3));

  /** Raising the saddle by twice the change wanted at fret 12: the rule used everywhere [P]. */
  @Test
  void raisesTheSaddleByTwiceTheChangeAtFretTwelve() {
    Clearances now = Clearances.overStraightNeck(5e-4, 2.5e-3);
    Clearances then = ActionChange.to(now, now.atTwelve() + 4e-4);
    assertThat(ActionChange.saddleRaised(now, then.atTwelve())).isCloseTo(8e-4, within(1e-12));
    assertThat(then.atNut(15)).isCloseTo(now.atNut(15), within(1e-12));
    assertThat(then.rise(15) - now.rise(15)).isCloseTo(8e-4, within(1e-12));
  }

  /** d cents / dh = 4 (C / 2) kappa h / X0^2 at fret 12, to first order [D]. */
  @Test
  void shiftsFretTwelveAsStretchSays() {
    double kappa = BASS.axialStiffness() / FrettedPitch.of(LIE).orElseThrow().openTension();
    double height = LIE.clearances().atTwelve();
    double slope = 4 * Cents.PER_UNIT / 2 * kappa * height / (SCALE * SCALE);
    double shift = ActionChange.shift(LIE, Fretting.USUAL, height + 1e-5, 12).orElseThrow() / 1e-5;
    assertThat(shift).isCloseTo(slope, within(0.05 * slope));
  }

  @Test
  void lowersThePitchOfFrettedNotesWithTheAction() {
    for (int fret = 1; fret <= 12; fret++) {
      assertThat(ActionChange.shift(LIE, Fretting.USUAL, 1.2e-3, fret).orElseThrow()).isNegative();
    }
  }
}
