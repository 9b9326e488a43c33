package sillet.desktop.start;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sillet.logbook.shop.Shop;
import sillet.logbook.units.LengthUnit;

class StartModelTest {
  private final StartModel model = new StartModel();

  @Test
  void needsNothingButAName() {
    model.name().typedProperty().set("  Quay Street Strings ");

    Shop shop = model.shop().orElseThrow();

    assertThat(shop.name()).isEqualTo("Quay Street Strings");
    assertThat(shop.lengthUnit()).isEqualTo(LengthUnit.MM);
    assertThat(shop.referenceHz()).isEqualTo(440);
    assertThat(shop.technicians()).isEmpty();
    assertThat(shop.demo()).isFalse();
  }

  @Test
  void blamesNameAndPitchAtOnce() {
    model.referenceHz().typedProperty().set("x");

    assertThat(model.shop()).isEmpty();
    assertThat(model.name().problemProperty().get()).isPresent();
    assertThat(model.referenceHz().problemProperty().get()).isPresent();
  }

  @Test
  void readsOneTechnicianALine() {
    model.name().typedProperty().set("Quay");
    model.techniciansProperty().set("Noor\n\n  Edda \r\nNoor\n");

    assertThat(model.shop().orElseThrow().technicians()).containsExactly("Noor", "Edda");
  }
}
