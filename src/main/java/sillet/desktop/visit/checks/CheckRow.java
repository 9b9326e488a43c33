package sillet.desktop.visit.checks;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;

/** One thing measured: where, how, as received and as left. */
public final class CheckRow {
  private final CheckPlace place;
  private final TypedFieldModel<Integer> fret;
  private final Map<Moment, TypedFieldModel<Length>> values = new EnumMap<>(Moment.class);
  private final Map<Moment, BenchCheck> recorded = new EnumMap<>(Moment.class);
  private CheckMethod method;
  private CheckMethod methodFilled;
  private String fretFilled;

  CheckRow(
      CheckPlace place,
      LengthUnit unit,
      int fretsOnNeck,
      BiFunction<CheckKind, Length, List<Message>> unusual) {
    this.place = place;
    this.method = place.usualMethod();
    this.methodFilled = method;
    this.fretFilled = written(place.usualFret());
    this.fret = TypedFieldModel.optional(Readers.whole(1, fretsOnNeck, ""));
    fret.fill(fretFilled);
    for (Moment moment : Moment.values()) {
      values.put(
          moment,
          TypedFieldModel.optional(Readers.length(unit))
              .sayingBack(length -> length.other(unit))
              .warning(length -> unusual.apply(place.kind(), length)));
    }
  }

  private static String written(int fret) {
    return fret == 0 ? "" : Integer.toString(fret);
  }

  public CheckKind kind() {
    return place.kind();
  }

  /** Number of the string, 0 for the whole neck. */
  public int string() {
    return place.string();
  }

  /** True where it matters at which fret it is measured. */
  public boolean fretChosen() {
    return place.fretChosen();
  }

  public TypedFieldModel<Integer> fret() {
    return fret;
  }

  public TypedFieldModel<Length> value(Moment moment) {
    TypedFieldModel<Length> field = values.get(moment);
    if (field == null) {
      throw new IllegalArgumentException("no field for " + moment);
    }
    return field;
  }

  public CheckMethod method() {
    return method;
  }

  /** Says how it is measured from now on. */
  public void measuredBy(CheckMethod how) {
    method = how;
  }

  /**
   * Takes what the record holds; a field in which something else was typed keeps that, and so do
   * the fret and the method if another one was chosen.
   *
   * @param check the newest for its moment
   */
  void take(BenchCheck check) {
    BenchCheck before = recorded.put(check.moment(), check);
    if (check.equals(before)) {
      return;
    }
    TypedFieldModel<Length> field = value(check.moment());
    String typed = field.typedProperty().get();
    if (typed.isBlank() || (before != null && typed.equals(before.typed()))) {
      field.fill(check.typed());
    }
    takeFret(written(check.fret()));
    takeMethod(check.method());
  }

  private void takeFret(String known) {
    String typed = fret.typedProperty().get();
    if (typed.equals(fretFilled) || typed.equals(known)) {
      fret.fill(known);
      fretFilled = known;
    }
  }

  private void takeMethod(CheckMethod known) {
    if (method == methodFilled || method == known) {
      method = known;
      methodFilled = known;
    }
  }

  /**
   * The check to be saved; empty if there is nothing new or it cannot be read. A check is
   * corrected, not taken back: where a recorded figure was cleared it is shown again.
   */
  Optional<BenchCheck> toSave(Moment moment) {
    BenchCheck known = recorded.get(moment);
    if (known != null && value(moment).typedProperty().get().isBlank()) {
      value(moment).fill(known.typed());
    }
    Optional<Length> length = value(moment).value();
    if (length.isEmpty() || !fret.look()) {
      return Optional.empty();
    }
    BenchCheck check =
        new BenchCheck(
            place.kind(),
            place.string(),
            fret.value().orElse(0),
            method,
            moment,
            length.get().mm(),
            length.get().typed());
    return check.equals(known) ? Optional.empty() : Optional.of(check);
  }

  /** What the record holds for a moment; null if nothing. */
  public @Nullable BenchCheck recorded(Moment moment) {
    return recorded.get(moment);
  }

  /** True if anything stands in it. */
  boolean filled() {
    return !recorded.isEmpty()
        || values.values().stream().anyMatch(v -> !v.typedProperty().get().isBlank());
  }
}
