package sillet.desktop.pickups;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.parts.Pickup;
import sillet.logbook.parts.PickupsMeasured;
import sillet.logbook.text.Message;
import sillet.logbook.units.LengthUnit;

/** The pickups of an instrument as they are typed, and the fret one listens at. */
final class PickupsModel {
  static final int MOST = 4;
  private static final int USUAL_FRET = 12;

  private final List<PickupLine> lines = new ArrayList<>();
  private final TypedFieldModel<Integer> fret =
      TypedFieldModel.required(Readers.whole(1, 36, "frets"), Message.of("pickups.fret-missing"));
  private double scaleMm;
  private List<Pickup> kept = List.of();

  PickupsModel(LengthUnit unit, double scaleMm) {
    this.scaleMm = scaleMm;
    for (int line = 0; line < MOST; line++) {
      lines.add(new PickupLine(unit, () -> this.scaleMm));
    }
    fret.fill(Integer.toString(USUAL_FRET));
  }

  List<PickupLine> lines() {
    return List.copyOf(lines);
  }

  /** The fret that is looked at beside the open string. */
  TypedFieldModel<Integer> fret() {
    return fret;
  }

  double scaleMm() {
    return scaleMm;
  }

  /** Takes the scale of the instrument; of fanned frets the middle between both sides. */
  void scale(double mm) {
    scaleMm = mm;
  }

  void take(PickupsMeasured measured) {
    for (int i = 0; i < Math.min(MOST, measured.pickups().size()); i++) {
      lines.get(i).take(measured.pickups().get(i));
    }
    kept = pickups();
  }

  /** The pickups that have a place. */
  List<Pickup> pickups() {
    List<Pickup> all = new ArrayList<>();
    for (int i = 0; i < MOST; i++) {
      lines.get(i).pickup(i + 1).ifPresent(all::add);
    }
    return all;
  }

  /** Whether something was typed that is not kept yet. */
  boolean changed() {
    return !pickups().isEmpty() && !pickups().equals(kept);
  }

  /** Judges every field; the measuring only if all can be taken and there is a pickup. */
  Optional<PickupsMeasured> finish(Instant now) {
    boolean all = true;
    for (PickupLine line : lines) {
      all = line.look() && all;
    }
    List<Pickup> pickups = pickups();
    return all && !pickups.isEmpty()
        ? Optional.of(new PickupsMeasured(now, pickups))
        : Optional.empty();
  }

  /** What was finished is on the disk. */
  void kept(PickupsMeasured measured) {
    kept = measured.pickups();
  }
}
