package sillet.desktop.sets;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Message;

/** A set as it is typed: a new one, a copy, or a change of one that lies in the drawer. */
final class SetEditorModel {
  private static final int MOST_STRINGS = 24;

  private final UUID id;
  private final boolean change;
  private final TypedFieldModel<String> name =
      TypedFieldModel.required(Readers.words(), Message.of("sets.name-missing"));
  private final TypedFieldModel<Integer> count =
      TypedFieldModel.required(
          Readers.whole(1, MOST_STRINGS, "strings"), Message.of("sets.count-missing"));
  private final List<SetLineModel> lines = new ArrayList<>();

  private SetEditorModel(UUID id, boolean change) {
    this.id = id;
    this.change = change;
    count
        .typedProperty()
        .addListener((property, before, now) -> count.value().ifPresent(this::lines));
  }

  /** A new set of so many strings. */
  static SetEditorModel fresh(UUID id, int strings) {
    SetEditorModel model = new SetEditorModel(id, false);
    model.count.fill(Integer.toString(strings));
    return model;
  }

  /** A new set that begins as another. */
  static SetEditorModel copy(UUID id, String name, List<StringMake> strings) {
    SetEditorModel model = new SetEditorModel(id, false);
    model.take(name, strings);
    return model;
  }

  /** A set of the drawer, to be kept in its own place. */
  static SetEditorModel change(StringSet set) {
    SetEditorModel model = new SetEditorModel(set.id(), true);
    model.take(set.name(), set.strings());
    return model;
  }

  private void take(String setName, List<StringMake> strings) {
    name.fill(setName);
    count.fill(Integer.toString(strings.size()));
    lines.clear();
    strings.forEach(make -> lines.add(SetLineModel.of(make)));
  }

  private void lines(int wanted) {
    while (lines.size() > wanted) {
      lines.remove(lines.size() - 1);
    }
    while (lines.size() < wanted) {
      lines.add(new SetLineModel());
    }
  }

  /** Whether it replaces a set of the drawer. */
  boolean change() {
    return change;
  }

  TypedFieldModel<String> name() {
    return name;
  }

  /** How many strings. */
  TypedFieldModel<Integer> count() {
    return count;
  }

  List<SetLineModel> lines() {
    return List.copyOf(lines);
  }

  /** Judges every field; the set only if all can be taken. */
  Optional<StringSet> finish() {
    boolean all = name.look();
    all = count.look() && all;
    for (SetLineModel line : lines) {
      all = line.look() && all;
    }
    return all
        ? Optional.of(
            new StringSet(
                id, name.value().orElseThrow(), lines.stream().map(SetLineModel::make).toList()))
        : Optional.empty();
  }
}
