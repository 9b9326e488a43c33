package sillet.desktop.start;

import java.util.List;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.shop.Shop;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;

/**
 * The three lines of a first start: the shop, its units, who works there. Only the first must be.
 */
public final class StartModel {
  private static final int HERTZ_DECIMALS = 2;

  private final TypedFieldModel<String> name =
      TypedFieldModel.required(Readers.words(), Message.of("start.name-blank"));
  private final ObjectProperty<LengthUnit> lengthUnit =
      new SimpleObjectProperty<>(this, "lengthUnit", LengthUnit.MM);
  private final TypedFieldModel<Double> referenceHz =
      TypedFieldModel.required(Readers.number("400", "480", "Hz"), Message.of("start.hertz-blank"));
  private final StringProperty technicians = new SimpleStringProperty(this, "technicians", "");
  private final BooleanProperty busy = new SimpleBooleanProperty(this, "busy", false);
  private final ObjectProperty<Optional<Message>> trouble =
      new SimpleObjectProperty<>(this, "trouble", Optional.empty());

  private final Shop base;

  /** Three lines with nothing typed in them. */
  public StartModel() {
    this(Shop.usual("", List.of()));
  }

  /** The lines of a shop that is there; what they do not show stays as it is. */
  public StartModel(Shop shop) {
    this.base = shop;
    name.fill(shop.name());
    lengthUnit.set(shop.lengthUnit());
    referenceHz.fill(written(shop.referenceHz()));
    technicians.set(String.join("\n", shop.technicians()));
  }

  public TypedFieldModel<String> name() {
    return name;
  }

  public ObjectProperty<LengthUnit> lengthUnitProperty() {
    return lengthUnit;
  }

  public TypedFieldModel<Double> referenceHz() {
    return referenceHz;
  }

  /** One name a line. */
  public StringProperty techniciansProperty() {
    return technicians;
  }

  /** True while a logbook is being made or opened. */
  public BooleanProperty busyProperty() {
    return busy;
  }

  /** Why no logbook could be made or opened. */
  public ObjectProperty<Optional<Message>> troubleProperty() {
    return trouble;
  }

  /** The shop as typed; empty, with the blame beside the field, while something is amiss. */
  public Optional<Shop> shop() {
    boolean named = name.look();
    boolean tuned = referenceHz.look();
    if (!named || !tuned) {
      return Optional.empty();
    }
    return Optional.of(
        new Shop(
            name.value().orElseThrow(),
            lengthUnit.get(),
            referenceHz.value().orElseThrow(),
            base.breakingSharePercent(),
            names(),
            base.demo()));
  }

  private static String written(double hertz) {
    return Figures.fixed(hertz, hertz == Math.rint(hertz) ? 0 : HERTZ_DECIMALS);
  }

  private List<String> names() {
    return technicians
        .get()
        .lines()
        .map(String::strip)
        .filter(line -> !line.isEmpty())
        .distinct()
        .toList();
  }
}
