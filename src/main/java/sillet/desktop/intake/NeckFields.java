package sillet.desktop.intake;

import java.util.List;
import java.util.function.Function;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.instruments.Neck;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/** Strings and scale as typed. */
public final class NeckFields {
  private static final int FEWEST_STRINGS = 4;
  private static final int MOST_STRINGS = 12;
  private static final int FEWEST_FRETS = 10;
  private static final int MOST_FRETS = 36;

  private final TypedFieldModel<Integer> strings;
  private final TypedFieldModel<Integer> frets;
  private final TypedFieldModel<Length> scaleTreble;
  private final TypedFieldModel<Length> scaleBass;
  private final TypedFieldModel<Length> radius;
  private final LengthUnit unit;
  private boolean leftHanded;

  NeckFields(LengthUnit unit, Function<Length, List<Message>> unusualScale) {
    this.unit = unit;
    strings =
        TypedFieldModel.required(
            Readers.whole(FEWEST_STRINGS, MOST_STRINGS, ""),
            Message.of("intake.instrument.strings-missing"));
    frets =
        TypedFieldModel.required(
            Readers.whole(FEWEST_FRETS, MOST_FRETS, ""),
            Message.of("intake.instrument.frets-missing"));
    scaleTreble =
        TypedFieldModel.required(above(unit), Message.of("intake.instrument.scale-missing"))
            .sayingBack(length -> length.other(unit))
            .warning(unusualScale);
    scaleBass =
        TypedFieldModel.optional(above(unit))
            .sayingBack(length -> length.other(unit))
            .warning(unusualScale);
    radius = TypedFieldModel.optional(above(unit)).sayingBack(length -> length.other(unit));
  }

  /** A length above zero. */
  static Function<String, Length> above(LengthUnit unit) {
    return text -> {
      Length length = Length.parse(text, unit);
      if (length.mm() <= 0) {
        throw Rejection.of("intake.length.none", text.strip());
      }
      return length;
    };
  }

  public TypedFieldModel<Integer> strings() {
    return strings;
  }

  public TypedFieldModel<Integer> frets() {
    return frets;
  }

  /** Twice from nut to fret 12 on the treble side. */
  public TypedFieldModel<Length> scaleTreble() {
    return scaleTreble;
  }

  /** The same on the bass side; blank where it is the same. */
  public TypedFieldModel<Length> scaleBass() {
    return scaleBass;
  }

  /** Radius of the board; blank for flat or not measured. */
  public TypedFieldModel<Length> radius() {
    return radius;
  }

  public boolean leftHanded() {
    return leftHanded;
  }

  public void leftHanded(boolean left) {
    leftHanded = left;
  }

  boolean look() {
    return Judged.all(List.of(strings, frets, scaleTreble, scaleBass, radius));
  }

  /** Fills the fields with a known neck. */
  void take(Neck neck) {
    strings.fill(Integer.toString(neck.strings()));
    frets.fill(Integer.toString(neck.frets()));
    scaleTreble.fill(InShopUnit.written(neck.scaleTrebleMm(), unit));
    boolean fanned = neck.scaleBassMm() != neck.scaleTrebleMm();
    scaleBass.fill(fanned ? InShopUnit.written(neck.scaleBassMm(), unit) : "");
    Double radiusMm = neck.radiusMm();
    radius.fill(radiusMm == null ? "" : InShopUnit.written(radiusMm, unit));
    leftHanded = neck.leftHanded();
  }

  /** The neck; call after the fields were judged. */
  Neck neck() {
    double treble = scaleTreble.value().orElseThrow().mm();
    return new Neck(
        strings.value().orElseThrow(),
        treble,
        scaleBass.value().map(Length::mm).orElse(treble),
        frets.value().orElseThrow(),
        radius.value().map(Length::mm).orElse(null),
        leftHanded);
  }
}
