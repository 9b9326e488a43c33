package sillet.desktop.visit.checks;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.Travel;

/** The room at one saddle as it stands now, away from the neck and toward it. */
public final class RoomRow {
  /** What the fields cannot show: half of the last digit of a shop that types thousandths. */
  private static final double SHOWN_MM = 0.0128;

  /** A length that went to the record and came back differs by rounding of the machine at most. */
  private static final double SAME_MM = 1e-6;

  private final int string;
  private final LengthUnit unit;
  private final TypedFieldModel<Length> back;
  private final TypedFieldModel<Length> forward;
  private String backFilled = "";
  private String forwardFilled = "";
  private double movedMm;
  private @Nullable Travel recorded;

  RoomRow(int string, LengthUnit unit) {
    this.string = string;
    this.unit = unit;
    this.back = field(unit);
    this.forward = field(unit);
  }

  private static TypedFieldModel<Length> field(LengthUnit unit) {
    return TypedFieldModel.optional(Readers.length(unit)).sayingBack(length -> length.other(unit));
  }

  public int string() {
    return string;
  }

  /** Left away from the neck. */
  public TypedFieldModel<Length> back() {
    return back;
  }

  /** Left toward the neck. */
  public TypedFieldModel<Length> forward() {
    return forward;
  }

  /**
   * Takes what the record holds; a field in which something else was typed keeps that.
   *
   * @param travel as the instrument came in; null if not measured
   * @param moved what the saddle went since then, millimetres away from the neck
   */
  void take(@Nullable Travel travel, double moved) {
    if (travel != null && (!travel.equals(recorded) || moved != movedMm)) {
      if (untouched(back, backFilled, movedMm, travel.backMm())) {
        backFilled = fill(back, travel.backMm(), -moved);
      }
      if (untouched(forward, forwardFilled, -movedMm, travel.forwardMm())) {
        forwardFilled = fill(forward, travel.forwardMm(), moved);
      }
    }
    movedMm = moved;
    recorded = travel;
  }

  private String fill(TypedFieldModel<Length> field, @Nullable Double mm, double moved) {
    String text = mm == null ? "" : InUnit.written(Math.max(0, mm + moved), unit);
    field.fill(text);
    return text;
  }

  /** True if the field still says what was filled in, or what it says is what was saved. */
  private static boolean untouched(
      TypedFieldModel<Length> field, String filled, double moved, @Nullable Double saved) {
    if (field.typedProperty().get().equals(filled)) {
      return true;
    }
    Double typed = asReceived(field, moved);
    return typed != null && saved != null && Math.abs(typed - saved) < SAME_MM;
  }

  /** The travel to be saved, counted back to how the saddle came in; empty if nothing is new. */
  Optional<Travel> toSave() {
    if (!back.look() || !forward.look()) {
      return Optional.empty();
    }
    Travel travel = new Travel(string, asReceived(back, movedMm), asReceived(forward, -movedMm));
    boolean blank = travel.backMm() == null && travel.forwardMm() == null;
    boolean nothingNew = (blank && recorded == null) || same(travel);
    return nothingNew ? Optional.empty() : Optional.of(travel);
  }

  private static @Nullable Double asReceived(TypedFieldModel<Length> field, double moved) {
    return field.value().map(length -> length.mm() + moved).orElse(null);
  }

  private boolean same(Travel travel) {
    return recorded != null
        && near(travel.backMm(), recorded.backMm())
        && near(travel.forwardMm(), recorded.forwardMm());
  }

  private static boolean near(@Nullable Double one, @Nullable Double other) {
    if (one == null || other == null) {
      return one == null && other == null;
    }
    return Math.abs(one - other) < SHOWN_MM;
  }
}
