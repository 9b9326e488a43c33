package sillet.desktop.forecast;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.forecast.InstrumentChange;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.StringsOn;

/** What is typed of an instrument that shall change. */
public final class ForecastModel {
  private static final int MOST_SEMITONES = 12;
  private static final int HIGHEST_CAPO = 12;

  private final StringsOn on;
  private final List<ForecastRow> rows;
  private final TypedFieldModel<Double> reference;
  private final TypedFieldModel<Integer> semitones;
  private final TypedFieldModel<Integer> capo;

  /**
   * Nothing changes yet.
   *
   * @param on strings and tuning now
   * @param unit the shop's
   * @param texts names of what is counted
   */
  public ForecastModel(StringsOn on, LengthUnit unit, Texts texts) {
    this.on = on;
    List<StringMake> makes = on.strings().stream().map(FittedString::make).toList();
    this.rows =
        on.strings().stream()
            .map(string -> new ForecastRow(string, makes, unit, this::referenceHz))
            .toList();
    this.reference =
        TypedFieldModel.optional(Readers.number("200", "900", texts.say("forecast.hz")));
    this.semitones =
        TypedFieldModel.optional(
            Readers.whole(-MOST_SEMITONES, MOST_SEMITONES, texts.say("forecast.semitones")));
    this.capo =
        TypedFieldModel.optional(Readers.whole(0, HIGHEST_CAPO, texts.say("forecast.capo")));
  }

  List<ForecastRow> rows() {
    return rows;
  }

  /** A4 then, hertz; blank for as now. */
  TypedFieldModel<Double> reference() {
    return reference;
  }

  /** All strings higher or lower. */
  TypedFieldModel<Integer> semitones() {
    return semitones;
  }

  /** Fret of a capo; blank for none. */
  TypedFieldModel<Integer> capo() {
    return capo;
  }

  private double referenceHz() {
    return reference.value().orElse(on.referenceHz());
  }

  /** A4 now, as written. */
  String referenceNow() {
    return Figures.fixed(on.referenceHz(), 0);
  }

  /** Tunes every string as the semitones say. */
  void tune() {
    if (semitones.look()) {
      rows.forEach(row -> row.tune(semitones.value().orElse(0)));
    }
  }

  /** Takes a set out of the drawer; null for the strings that are on. */
  void take(@Nullable StringSet set) {
    for (int i = 0; i < rows.size(); i++) {
      rows.get(i).take(set == null ? null : set.strings().get(i));
    }
  }

  /** Whether a set has a string for each that is on. */
  boolean fits(StringSet set) {
    return set.strings().size() == rows.size();
  }

  void clear() {
    reference.fill("");
    semitones.fill("");
    capo.fill("");
    rows.forEach(ForecastRow::clear);
  }

  /** Why something that was typed cannot be read. */
  Optional<Message> problem() {
    Stream<TypedFieldModel<?>> all =
        Stream.concat(
            Stream.of(reference, semitones, capo), rows.stream().flatMap(ForecastRow::fields));
    return all.map(field -> field.problemProperty().get()).flatMap(Optional::stream).findFirst();
  }

  /** What changes; empty where something that was typed cannot be read. */
  public Optional<InstrumentChange> change() {
    boolean good = reference.look();
    good &= capo.look();
    for (ForecastRow row : rows) {
      good &= row.look();
    }
    if (!good) {
      return Optional.empty();
    }
    return Optional.of(
        new InstrumentChange(
            rows.stream().map(row -> row.change(referenceHz() / on.referenceHz())).toList(),
            capo.value().orElse(0)));
  }
}
