package sillet.acoustics.stiff;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.tables.PublishedString;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

@DisplayName("Tension of the open string")
class OpenTensionTest {

  private static final double INCH = 0.0254;

  static List<PublishedString> published() {
    return PublishedString.all();
  }

  /** Table of 2024 [S]: without stiffness, the printed tension belongs to the printed mass. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("published")
  @DisplayName("V3 the other way round: tension from pitch, mass and length")
  void findsThePublishedTension(PublishedString string) {
    StringConstants flexible = new StringConstants(string.unitMass(), 0, 0, 0);
    double tension =
        OpenTension.of(flexible, PublishedString.SCALE, string.hz(), EndCondition.PINNED)
            .orElseThrow();
    assertThat(tension / string.tension()).isCloseTo(1, within(0.0018));
  }

  @Test
  void givesBackThePitchItWasAskedFor() {
    for (double gauge : new double[] {.008, .017, .026, .042}) {
      StringConstants string =
          StringEstimate.of(StringSpec.of(gauge * INCH, Construction.PLAIN_STEEL), 196, 0.648);
      double tension = OpenTension.of(string, 0.648, 196, EndCondition.CLAMPED).orElseThrow();
      double delta = StiffString.bendingLength(string.bendingStiffness(), tension);
      double hz = StiffString.hz(1, 0.648, tension, string.unitMass(), delta, 2);
      assertThat(Cents.between(196, hz)).isCloseTo(0, within(1e-9));
    }
  }

  @Test
  void saysThatARodIsNoString() {
    StringConstants rod =
        StringEstimate.of(StringSpec.of(3.8e-3, Construction.PLAIN_STEEL), 20, 0.25);
    assertThat(OpenTension.of(rod, 0.25, 20, EndCondition.USUAL)).isInstanceOf(NotSolved.class);
    assertThat(OpenTension.of(rod, 0.25, 20, EndCondition.PINNED)).isInstanceOf(NotSolved.class);
  }

  @Test
  void comesBackFromSlenderToHopelesslyStiff() {
    for (int power = -12; power <= 12; power++) {
      StringConstants string = new StringConstants(1e-3, 1e4, Math.pow(10, power), 0);
      boolean solved =
          OpenTension.of(string, 0.65, 110, EndCondition.USUAL) instanceof Solved<Double>;
      // bending length over length passes 0.04 between 1e-2 and 1e-1 N m2, and 0.3 beyond
      assertThat(solved).as("1e" + power).isEqualTo(power <= -1);
    }
  }

  @Test
  void refusesALengthOrPitchThatIsNone() {
    StringConstants string = new StringConstants(1e-3, 1e4, 1e-5, 0);
    assertThatThrownBy(() -> OpenTension.of(string, 0, 110, EndCondition.USUAL))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> OpenTension.of(string, 0.65, Double.NaN, EndCondition.USUAL))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
