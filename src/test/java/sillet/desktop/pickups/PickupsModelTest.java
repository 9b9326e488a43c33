package sillet.desktop.pickups;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.logbook.parts.Pickup;
import sillet.logbook.parts.PickupsMeasured;
import sillet.logbook.units.LengthUnit;

class PickupsModelTest {
  private static final Instant NOW = Instant.parse("2025-12-01T14:05:00Z");

  private final PickupsModel model = new PickupsModel(LengthUnit.MM, 648);

  @Test
  void listensWhereItWasTyped() {
    model.lines().get(0).place().typedProperty().set("162");

    assertThat(model.lines().get(0).listens().orElseThrow().share(0)).isCloseTo(.25, within(1e-9));
    assertThat(model.lines().get(1).listens()).isEmpty();
  }

  @Test
  void takesHeightsInInchesToo() {
    PickupLine line = model.lines().get(0);
    line.name().typedProperty().set("bridge");
    line.place().typedProperty().set("41.5");
    line.treble().typedProperty().set("4/64");

    PickupsMeasured measured = model.finish(NOW).orElseThrow();
    assertThat(measured.pickups())
        .containsExactly(new Pickup("bridge", 41.5, 4.0 / 64 * 25.4, null));
  }

  @Test
  void numbersAPickupWithoutAName() {
    model.lines().get(1).place().typedProperty().set("100");

    assertThat(model.pickups()).containsExactly(new Pickup("2", 100, null, null));
  }

  @Test
  void refusesAPlaceBeyondTheNut() {
    model.lines().get(0).place().typedProperty().set("700");

    assertThat(model.finish(NOW)).isEmpty();
    assertThat(model.lines().get(0).problem()).isPresent();
    assertThat(model.lines().get(0).listens()).isEmpty();
  }

  @Test
  void knowsWhatIsKept() {
    PickupsMeasured before =
        new PickupsMeasured(NOW, List.of(new Pickup("neck", 162.25, 1.6, 2.0)));
    model.take(before);
    assertThat(model.changed()).isFalse();
    assertThat(model.finish(NOW)).contains(before);

    model.lines().get(0).treble().typedProperty().set("2.4");
    assertThat(model.changed()).isTrue();
    model.kept(model.finish(NOW).orElseThrow());
    assertThat(model.changed()).isFalse();
  }

  @Test
  void logsEveryHeightTheNewestFirst() {
    PickupsMeasured later = new PickupsMeasured(NOW, List.of(new Pickup("neck", 162, 2.0, null)));
    PickupsMeasured earlier =
        new PickupsMeasured(
            NOW.minusSeconds(86400 * 3),
            List.of(new Pickup("neck", 162, 1.2, 1.6), new Pickup("bridge", 41, null, null)));

    assertThat(HeightRow.of(List.of(later, earlier), List.of(), ZoneOffset.UTC))
        .containsExactly(
            new HeightRow(LocalDate.of(2025, 12, 1), "neck", 0, 0, 2.0, null),
            new HeightRow(LocalDate.of(2025, 11, 28), "neck", 0, 0, 1.2, 1.6));
  }
}
