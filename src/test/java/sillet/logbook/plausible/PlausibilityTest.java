package sillet.logbook.plausible;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.Heights;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/** The limits are the shop's own, wide ones: common practice, no source. */
class PlausibilityTest {
  private static final Plausibility METRIC = new Plausibility(LengthUnit.MM);
  private static final Plausibility INCH = new Plausibility(LengthUnit.INCH);

  @ParameterizedTest
  @CsvSource({
    "relief, -0.5, true", "relief, -0.51, false", "relief, 1.5, true", "relief, 1.51, false",
    "action, 0.5, true", "action, 0.49, false", "action, 13, true", "action, 13.01, false",
    "clearance, 0, true", "clearance, -0.01, false", "clearance, 2, true", "clearance, 2.01, false",
    "scale, 250, true", "scale, 249.9, false", "scale, 1000, true", "scale, 1000.1, false",
    "gauge, 0.006, true", "gauge, 0.0059, false", "gauge, 0.150, true", "gauge, 0.151, false",
    "cents, -100, true", "cents, -100.1, false", "cents, 100, true", "cents, 100.1, false",
    "humidity, 5, true", "humidity, 4.9, false", "humidity, 99, true", "humidity, 99.1, false",
    "sd, 0.01, true", "sd, 0, false"
  })
  void speaksUpOutsideTheUsualSpanOnly(String quantity, double value, boolean usual) {
    assertThat(check(quantity, value).isEmpty()).isEqualTo(usual);
  }

  @Test
  void saysTheOtherUnitBack() {
    assertThat(METRIC.reliefMm(5.08))
        .map(PlausibilityTest::said)
        .contains("relief of 5.08 mm = 0.200 in; usual is -0.5 mm to 1.5 mm");
    assertThat(INCH.reliefMm(5.08))
        .map(PlausibilityTest::said)
        .contains("relief of 0.200 in = 5.08 mm; usual is -0.020 in to 0.059 in");
    assertThat(METRIC.gaugeIn(0.46))
        .map(PlausibilityTest::said)
        .contains("gauge of .460 in = 11.68 mm; usual is .006 in to .150 in");
    assertThat(METRIC.scaleMm(25.5))
        .map(PlausibilityTest::said)
        .contains("scale of 25.50 mm = 1.004 in; usual is 250.0 mm to 1000.0 mm");
  }

  @Test
  void asksWhetherAThickPlainStringIsWound() {
    assertThat(METRIC.of(string(648, 0.046, Heights.NOT_KNOWN)))
        .extracting(Message::key)
        .containsExactly("plausible.plain");
    assertThat(METRIC.of(string(648, 0.026, Heights.NOT_KNOWN))).isEmpty();
  }

  @Test
  void looksAtEveryFigureOfAString() {
    BenchString odd = string(20, 0.2, new Heights(20.0, 3.0, 2.0));
    BenchString usual = string(648, 0.010, new Heights(1.6, 0.5, 0.2));
    BenchString unmeasured = string(648, 0.010, Heights.NOT_KNOWN);

    assertThat(METRIC.of(odd))
        .extracting(Message::key)
        .containsExactly(
            "plausible.scale",
            "plausible.gauge",
            "plausible.action",
            "plausible.clearance",
            "plausible.relief");
    assertThat(METRIC.of(usual)).isEmpty();
    assertThat(METRIC.of(unmeasured)).isEmpty();
  }

  private static Optional<Message> check(String quantity, double value) {
    return switch (quantity) {
      case "relief" -> METRIC.reliefMm(value);
      case "action" -> METRIC.actionMm(value);
      case "clearance" -> METRIC.clearanceMm(value);
      case "scale" -> METRIC.scaleMm(value);
      case "gauge" -> METRIC.gaugeIn(value);
      case "cents" -> METRIC.cents(value);
      case "humidity" -> METRIC.humidityPct(value);
      case "sd" -> METRIC.sdCents(value);
      default -> throw new IllegalArgumentException(quantity);
    };
  }

  private static BenchString string(double scaleMm, double gaugeIn, Heights heights) {
    FittedString fitted =
        new FittedString(
            1,
            Pitch.parse("E4", Pitch.CONCERT_A4_HZ),
            scaleMm,
            StringMake.of(gaugeIn, Construction.PLAIN_STEEL));
    NoteReadings none =
        new NoteReadings(new java.util.TreeMap<>(Map.of()), null, Reference.OPEN, 0.5);
    return new BenchString("demo", fitted, heights, SaddleRoom.NOT_KNOWN, none);
  }

  private static String said(Message message) {
    return Texts.english().say(message);
  }
}
