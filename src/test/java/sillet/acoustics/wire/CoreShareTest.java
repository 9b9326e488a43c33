package sillet.acoustics.wire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The shares are from memory, unverified [M]; the table here keeps them from drifting. */
@DisplayName("Usual thickness of cores [M]")
class CoreShareTest {

  private static final double INCH = 0.0254;

  @ParameterizedTest(name = "{0} m, {1} in: {2}")
  @CsvSource({
    "0.648, .020, 0.62",
    "0.648, .032, 0.46",
    "0.648, .046, 0.39",
    "0.648, .056, 0.34",
    "0.350, .024, 0.53",
    "0.350, .040, 0.40",
    "0.864, .045, 0.41",
    "0.864, .105, 0.25",
    "0.864, .130, 0.22"
  })
  void standsAtTheTabledShare(double scale, double gauge, double share) {
    assertThat(CoreShare.usual(gauge * INCH, scale).share()).isCloseTo(share, within(1e-9));
  }

  @Test
  void runsLevelBeyondTheTableAndStraightWithin() {
    assertThat(CoreShare.usual(0.010 * INCH, 0.648).share()).isEqualTo(0.62);
    assertThat(CoreShare.usual(0.070 * INCH, 0.648).share()).isEqualTo(0.34);
    assertThat(CoreShare.usual(0.023 * INCH, 0.648).share()).isCloseTo(0.59, within(1e-9));
  }

  @Test
  void takesThinStringsOfALongScaleFromTheGuitar() {
    assertThat(CoreShare.usual(0.030 * INCH, 0.864))
        .isEqualTo(CoreShare.usual(0.030 * INCH, 0.648));
  }

  @Test
  void spreadsMoreForABass() {
    assertThat(CoreShare.usual(0.105 * INCH, 0.864).relativeSd()).isEqualTo(0.18);
    assertThat(CoreShare.usual(0.046 * INCH, 0.648).relativeSd()).isEqualTo(0.12);
  }

  /** A maker's light acoustic set, cores .0175 .016 .015 .013 for strings 6 to 3 (trade text). */
  @ParameterizedTest(name = "{0} in on a core of {1} in")
  @DisplayName("cores of a light acoustic set lie within two standard deviations")
  @CsvSource({".053, .0175", ".042, .016", ".032, .015", ".024, .013"})
  void agreesWithAMakersSet(double gauge, double core) {
    CoreShare usual = CoreShare.usual(gauge * INCH, 0.645);
    assertThat(core / gauge)
        .isCloseTo(usual.share(), within(2 * usual.relativeSd() * usual.share()));
  }
}
