package sillet.desktop.pickups;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleSupplier;
import java.util.stream.Stream;
import sillet.acoustics.pickups.PickupPlace;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.parts.Pickup;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/** One pickup as it is typed; a line with no place is not there. */
final class PickupLine {
  private static final double HIGHEST_MM = 30;

  private final LengthUnit unit;
  private final DoubleSupplier scaleMm;
  private final TypedFieldModel<String> name = TypedFieldModel.optional(Readers.words());
  private final TypedFieldModel<Length> place;
  private final TypedFieldModel<Length> treble;
  private final TypedFieldModel<Length> bass;

  PickupLine(LengthUnit unit, DoubleSupplier scaleMm) {
    this.unit = unit;
    this.scaleMm = scaleMm;
    this.place = TypedFieldModel.optional(this::readPlace);
    this.treble = TypedFieldModel.optional(this::readHeight);
    this.bass = TypedFieldModel.optional(this::readHeight);
  }

  TypedFieldModel<String> name() {
    return name;
  }

  /** From the saddle to the middle of the pickup. */
  TypedFieldModel<Length> place() {
    return place;
  }

  /** Gap at string 1 with the last fret pressed. */
  TypedFieldModel<Length> treble() {
    return treble;
  }

  /** Gap at the lowest string. */
  TypedFieldModel<Length> bass() {
    return bass;
  }

  List<TypedFieldModel<?>> fields() {
    return List.of(name, place, treble, bass);
  }

  void take(Pickup pickup) {
    Double trebleMm = pickup.trebleMm();
    Double bassMm = pickup.bassMm();
    name.fill(pickup.name());
    place.fill(written(pickup.fromBridgeMm()));
    treble.fill(trebleMm == null ? "" : written(trebleMm));
    bass.fill(bassMm == null ? "" : written(bassMm));
  }

  private String written(double mm) {
    return unit == LengthUnit.MM
        ? Figures.fixed(mm, 2).replaceFirst("\\.?0+$", "")
        : Figures.fixed(mm / LengthUnit.MM_PER_INCH, 3) + "in";
  }

  boolean look() {
    boolean all = true;
    for (TypedFieldModel<?> field : fields()) {
      all = field.look() && all;
    }
    return all;
  }

  /** The pickup as typed; empty while it has no place. */
  Optional<Pickup> pickup(int number) {
    return place
        .value()
        .map(
            at ->
                new Pickup(
                    name.value().orElse(Integer.toString(number)),
                    at.mm(),
                    treble.value().map(Length::mm).orElse(null),
                    bass.value().map(Length::mm).orElse(null)));
  }

  /** Where it listens; empty while it has no place. */
  Optional<PickupPlace> listens() {
    double scale = scaleMm.getAsDouble();
    return place
        .value()
        .filter(at -> at.mm() > 0 && at.mm() < scale)
        .map(at -> new PickupPlace(scale / 1000, at.mm() / 1000));
  }

  /** What is wrong with the line, the first thing only. */
  Optional<Message> problem() {
    return Stream.of(name, place, treble, bass)
        .flatMap(field -> field.problemProperty().get().stream())
        .findFirst();
  }

  private Length readPlace(String text) {
    Length length = Length.parse(text, unit);
    double longest = scaleMm.getAsDouble();
    if (!(length.mm() > 0 && length.mm() < longest)) {
      throw Rejection.of("field.between", "0", Figures.fixed(longest, 0), "mm", text.strip());
    }
    return length;
  }

  private Length readHeight(String text) {
    Length length = Length.parse(text, unit);
    if (!(length.mm() >= 0 && length.mm() <= HIGHEST_MM)) {
      throw Rejection.of("field.between", "0", "30", "mm", text.strip());
    }
    return length;
  }
}
