package sillet.acoustics.pickups;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("Where a pickup listens")
class PickupPlaceTest {

  private static final double SCALE = 0.648;

  /** Nodes of the ideal string lie at whole fractions [D, textbook]. */
  @ParameterizedTest(name = "at a {0}th of the string harmonic {0} is not heard")
  @CsvSource({"2", "3", "4", "5", "7"})
  void doesNotHearAHarmonicAtItsNode(int part) {
    PickupPlace place = new PickupPlace(SCALE, SCALE / part);

    assertThat(place.unheard(0, part)).containsExactly(part);
    assertThat(place.response(part, 0)).isCloseTo(0, within(1e-12));
    assertThat(place.response(1, 0)).isGreaterThan(0.4);
  }

  @Test
  void hearsOthersAtAFret() {
    PickupPlace quarter = new PickupPlace(SCALE, SCALE / 4);

    assertThat(quarter.unheard(0, 8)).containsExactly(4, 8);
    assertThat(quarter.share(12)).isCloseTo(0.5, within(1e-12));
    assertThat(quarter.unheard(12, 6)).containsExactly(2, 4, 6);
  }

  /** The stated limit: 0.1 of a whole number is sin(0.1 pi) = 0.309, 10.2 dB down [D]. */
  @Test
  void callsUnheardWhatIsTenDecibelsDown() {
    PickupPlace inside = new PickupPlace(1, 0.3 + 0.0001);
    double atLimit = Math.sin(Math.PI * PickupPlace.UNHEARD_WITHIN);

    assertThat(20 * Math.log10(atLimit)).isCloseTo(-10.2, within(0.05));
    for (int harmonic : inside.unheard(0, 20)) {
      assertThat(inside.response(harmonic, 0)).isLessThanOrEqualTo(atLimit + 1e-9);
    }
    assertThat(inside.unheard(0, 3)).containsExactly(3);
    assertThat(new PickupPlace(1, 0.3 - 0.0001).unheard(0, 3)).isEmpty();
  }

  @Test
  void saysNothingWhereTheFretLiesOverThePickup() {
    PickupPlace neck = new PickupPlace(SCALE, SCALE / 4);

    assertThat(neck.share(24)).isCloseTo(1, within(1e-12));
    assertThat(neck.unheard(24, 8)).isEmpty();
  }

  @Test
  void refusesPlacesOffTheString() {
    assertThatThrownBy(() -> new PickupPlace(SCALE, 0))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new PickupPlace(SCALE, SCALE))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new PickupPlace(SCALE, 0.1).response(0, 0))
        .isInstanceOf(IllegalArgumentException.class);
  }

  /** The formula itself, df / f = -(k L / (pi^2 T)) sin^2(pi x / L) [D], against exact roots. */
  @Test
  void pullsFlatAsTheExactRootSays() {
    PickupPlace place = new PickupPlace(SCALE, 0.16);
    double stiffness = 2.0;
    double tension = 72.4;

    double cents = MagnetPull.cents(place, stiffness, tension);

    assertThat(cents).isNegative();
    assertThat(cents).isCloseTo(exactCents(place, stiffness / tension), within(0.03));
    assertThat(MagnetPull.cents(place, 0, tension)).isZero();
    assertThat(MagnetPull.share(new PickupPlace(SCALE, SCALE / 2), 0)).isCloseTo(1, within(1e-12));
  }

  /** Cents between the fundamentals with and without a spring of -k on the string. */
  private static double exactCents(PickupPlace place, double kick) {
    return 1200 / Math.log(2) * Math.log(lowestWave(place, kick) / lowestWave(place, 0));
  }

  /** Wave number of the fundamental, by bisection on where a shot from the bridge ends. */
  private static double lowestWave(PickupPlace place, double kick) {
    double low = 0.5 * Math.PI / place.scale();
    double high = 1.5 * Math.PI / place.scale();
    for (int step = 0; step < 80; step++) {
      double wave = (low + high) / 2;
      if (endOfShot(place, kick, wave) > 0) {
        low = wave;
      } else {
        high = wave;
      }
    }
    return low;
  }

  /** Displacement at the nut of a wave that starts at the bridge and is kinked over the pickup. */
  private static double endOfShot(PickupPlace place, double kick, double wave) {
    double x = place.fromBridge();
    double rest = place.scale() - x;
    double there = Math.sin(wave * x);
    double slope = wave * Math.cos(wave * x) - kick * there;
    return there * Math.cos(wave * rest) + slope / wave * Math.sin(wave * rest);
  }
}
