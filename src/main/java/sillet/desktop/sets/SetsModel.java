package sillet.desktop.sets;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/** The drawer of string sets: the one looked at, the one compared, the tuning and the scale. */
final class SetsModel {
  private record Terms(String tuning, String scale) {}

  private final LengthUnit unit;
  private final double referenceHz;
  private final ObservableList<StringSet> sets = FXCollections.observableArrayList();
  private final ObjectProperty<Optional<StringSet>> chosen =
      new SimpleObjectProperty<>(this, "chosen", Optional.empty());
  private final ObjectProperty<Optional<StringSet>> compared =
      new SimpleObjectProperty<>(this, "compared", Optional.empty());
  private final ObjectProperty<Optional<Message>> trouble =
      new SimpleObjectProperty<>(this, "trouble", Optional.empty());
  private final TypedFieldModel<List<Pitch>> tuning;
  private final TypedFieldModel<Length> scale;
  private final Map<UsualTuning, Terms> typedBefore = new EnumMap<>(UsualTuning.class);

  SetsModel(LengthUnit unit, double referenceHz) {
    this.unit = unit;
    this.referenceHz = referenceHz;
    this.tuning = TypedFieldModel.required(this::readTuning, Message.of("sets.tuning-missing"));
    this.scale =
        TypedFieldModel.required(this::readScale, Message.of("sets.scale-missing"))
            .sayingBack(length -> length.other(unit));
  }

  ObservableList<StringSet> sets() {
    return sets;
  }

  ObjectProperty<Optional<StringSet>> chosenProperty() {
    return chosen;
  }

  /** The set whose tensions stand beside those of the chosen one. */
  ObjectProperty<Optional<StringSet>> comparedProperty() {
    return compared;
  }

  /** Why nothing can be shown. */
  ObjectProperty<Optional<Message>> troubleProperty() {
    return trouble;
  }

  /** A pitch for each string, string 1 first. */
  TypedFieldModel<List<Pitch>> tuning() {
    return tuning;
  }

  TypedFieldModel<Length> scale() {
    return scale;
  }

  /** Takes the sets of the logbook; keeps what was chosen and compared where it still is. */
  void show(List<StringSet> all) {
    trouble.set(Optional.empty());
    Optional<UUID> wanted = chosen.get().map(StringSet::id);
    Optional<UUID> beside = compared.get().map(StringSet::id);
    sets.setAll(all);
    compared.set(find(beside));
    choose(find(wanted).or(() -> all.stream().findFirst()));
  }

  private Optional<StringSet> find(Optional<UUID> id) {
    return id.flatMap(one -> sets.stream().filter(set -> set.id().equals(one)).findFirst());
  }

  /** Looks at a set; its tuning and scale are those typed last for sets of its kind. */
  void choose(Optional<StringSet> set) {
    chosen
        .get()
        .ifPresent(
            before ->
                typedBefore.put(
                    UsualTuning.of(before),
                    new Terms(tuning.typedProperty().get(), scale.typedProperty().get())));
    chosen.set(set);
    set.ifPresent(
        now -> {
          UsualTuning usual = UsualTuning.of(now);
          Terms terms = typedBefore.getOrDefault(usual, new Terms(usual.pitches(), written(usual)));
          // how many pitches are right depends on the set, so the text is read anew
          tuning.fill("");
          tuning.fill(terms.tuning());
          scale.fill(terms.scale());
        });
  }

  private String written(UsualTuning usual) {
    return unit == LengthUnit.MM
        ? Figures.fixed(usual.scaleMm(), 0)
        : Figures.fixed(usual.scaleMm() / LengthUnit.MM_PER_INCH, 2) + "in";
  }

  /** Sets the chosen one beside those looked at next; the same again takes it away. */
  void compare() {
    boolean same = compared.get().map(StringSet::id).equals(chosen.get().map(StringSet::id));
    compared.set(same ? Optional.empty() : chosen.get());
  }

  /** The chosen set in figures; empty while tuning or scale cannot be read. */
  Optional<SetFigures> figures() {
    return chosen.get().flatMap(this::figures);
  }

  /** The compared set at the same tuning and scale, unless it is the chosen one itself. */
  Optional<SetFigures> comparedFigures() {
    return compared
        .get()
        .filter(one -> !chosen.get().map(StringSet::id).equals(Optional.of(one.id())))
        .flatMap(this::figures);
  }

  private Optional<SetFigures> figures(StringSet set) {
    if (tuning.value().isEmpty() || scale.value().isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        SetFigures.of(set, tuning.value().orElseThrow(), scale.value().orElseThrow().mm()));
  }

  private List<Pitch> readTuning(String text) {
    List<Pitch> pitches = new ArrayList<>();
    for (String word : text.strip().split("\\s+", -1)) {
      pitches.add(Pitch.parse(word, referenceHz));
    }
    int strings = chosen.get().map(set -> set.strings().size()).orElse(pitches.size());
    if (pitches.size() != strings) {
      throw Rejection.of(
          "sets.tuning-count", Integer.toString(strings), Integer.toString(pitches.size()));
    }
    return pitches;
  }

  private Length readScale(String text) {
    Length length = Length.parse(text, unit);
    if (!(length.mm() > 0)) {
      throw Rejection.of("sets.scale-above-zero", text.strip());
    }
    return length;
  }
}
