package sillet.desktop.forecast;

import java.util.List;
import java.util.function.DoubleSupplier;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.forecast.StringChange;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/** What is typed of one string that shall change; a blank field stays as it is. */
final class ForecastRow {
  private final FittedString now;
  private final TypedFieldModel<Pitch> pitch;
  private final TypedFieldModel<NewGauge> gauge;
  private final TypedFieldModel<Length> action;
  private @Nullable StringMake fromSet;

  ForecastRow(
      FittedString now, List<StringMake> strings, LengthUnit unit, DoubleSupplier referenceHz) {
    this.now = now;
    this.pitch = TypedFieldModel.optional(text -> Pitch.parse(text, referenceHz.getAsDouble()));
    this.gauge = TypedFieldModel.optional(text -> NewGauge.parse(text, strings));
    this.action =
        TypedFieldModel.<Length>optional(text -> Length.parse(text, unit))
            .sayingBack(length -> length.other(unit));
  }

  FittedString now() {
    return now;
  }

  TypedFieldModel<Pitch> pitch() {
    return pitch;
  }

  TypedFieldModel<NewGauge> gauge() {
    return gauge;
  }

  TypedFieldModel<Length> action() {
    return action;
  }

  /** Tunes it to another note, so many semitones from now; 0 as now. */
  void tune(int semitones) {
    pitch.fill(semitones == 0 ? "" : ShiftedNote.of(now.pitch(), semitones));
  }

  /** Takes a string of another set; null for the one that is on. */
  void take(@Nullable StringMake make) {
    boolean same = make == null || make.equals(now.make());
    fromSet = same ? null : make;
    gauge.fill(same || make == null ? "" : Figures.gauge(make.gaugeIn()));
  }

  void clear() {
    take(null);
    pitch.fill("");
    action.fill("");
  }

  /** Everything that can be typed. */
  Stream<TypedFieldModel<?>> fields() {
    return Stream.of(pitch, gauge, action);
  }

  /** Judges what stands there. */
  boolean look() {
    boolean good = pitch.look();
    good &= gauge.look();
    return action.look() && good;
  }

  /**
   * What changes; a note stays the same note under another reference.
   *
   * @param referenceShare the reference then, counted in the one now
   */
  StringChange change(double referenceShare) {
    Pitch tuned = pitch.value().orElse(null);
    if (tuned == null) {
      tuned = under(referenceShare);
    }
    StringMake make = make();
    return new StringChange(
        now.number(),
        tuned,
        make == null ? null : make.gaugeIn(),
        make == null ? null : make.construction(),
        make == null ? null : make.coreIn(),
        make == null ? null : make.unitMassGPerM(),
        action.value().map(Length::mm).orElse(null));
  }

  private @Nullable Pitch under(double referenceShare) {
    boolean moves = referenceShare != 1 && ShiftedNote.isNote(now.pitch());
    return moves ? new Pitch(now.pitch().typed(), now.pitch().hz() * referenceShare) : null;
  }

  /** What a set knows beyond gauge and construction counts only while its gauge stands there. */
  private @Nullable StringMake make() {
    NewGauge typed = gauge.value().orElse(null);
    if (typed == null) {
      return null;
    }
    StringMake set = fromSet;
    boolean ofSet =
        set != null
            && typed.construction() == null
            && Figures.gauge(set.gaugeIn()).equals(Figures.gauge(typed.gaugeIn()));
    if (ofSet) {
      return set;
    }
    var kind = typed.construction() == null ? now.make().construction() : typed.construction();
    return StringMake.of(typed.gaugeIn(), kind);
  }
}
