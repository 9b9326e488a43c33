package sillet.desktop.shell;

import java.time.Clock;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import sillet.desktop.controls.AtBench;
import sillet.logbook.shop.Shop;

/**
 * The shop that is open and who is at its bench. The first technician is, until another says so.
 */
final class BenchNow implements AtBench {
  private final ObjectProperty<Shop> shop;
  private final StringProperty technician;
  private final Clock clock;

  BenchNow(Shop shop, Clock clock) {
    this.shop = new SimpleObjectProperty<>(this, "shop", shop);
    String first = shop.technicians().isEmpty() ? "" : shop.technicians().get(0);
    this.technician = new SimpleStringProperty(this, "technician", first);
    this.clock = clock;
  }

  /** The shop was saved anew; whoever is at the bench stays, if still named. */
  void rename(Shop renamed) {
    shop.set(renamed);
    if (!renamed.technicians().contains(technician.get())) {
      technician.set(renamed.technicians().isEmpty() ? "" : renamed.technicians().get(0));
    }
  }

  @Override
  public Shop shop() {
    return shop.get();
  }

  @Override
  public String technician() {
    return technician.get();
  }

  @Override
  public Clock clock() {
    return clock;
  }

  StringProperty technicianProperty() {
    return technician;
  }
}
