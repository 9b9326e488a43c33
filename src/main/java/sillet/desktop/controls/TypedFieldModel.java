package sillet.desktop.controls;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;

/**
 * What was typed and what it means. The text stays as typed, also when it cannot be taken; it is
 * judged when the field is left, and from then on cleared of blame as soon as it can be taken.
 *
 * @param <T> what the text is read as
 */
public final class TypedFieldModel<T> {
  private final Function<String, T> reader;
  private final @Nullable Message whenBlank;
  private final StringProperty typed = new SimpleStringProperty(this, "typed", "");
  private final ReadOnlyObjectWrapper<FieldState> state =
      new ReadOnlyObjectWrapper<>(this, "state", FieldState.NOT_LOOKED_AT);
  private final ReadOnlyObjectWrapper<Optional<Message>> problem =
      new ReadOnlyObjectWrapper<>(this, "problem", Optional.empty());
  private final ReadOnlyStringWrapper saidBack = new ReadOnlyStringWrapper(this, "saidBack", "");
  private final ReadOnlyObjectWrapper<List<Message>> warnings =
      new ReadOnlyObjectWrapper<>(this, "warnings", List.of());
  private Function<T, String> sayBack = value -> "";
  private Function<T, List<Message>> warn = value -> List.of();
  private Optional<T> value = Optional.empty();
  private Optional<Message> fault = Optional.empty();

  private TypedFieldModel(Function<String, T> reader, @Nullable Message whenBlank) {
    this.reader = reader;
    this.whenBlank = whenBlank;
    read("");
    typed.addListener((property, before, now) -> typedOn(now));
  }

  /**
   * A field that may stay blank.
   *
   * @param reader reads the text or throws a {@link Rejection}
   */
  public static <T> TypedFieldModel<T> optional(Function<String, T> reader) {
    return new TypedFieldModel<>(reader, null);
  }

  /**
   * A field that must be filled.
   *
   * @param reader reads the text or throws a {@link Rejection}
   * @param whenBlank what to say of a blank
   */
  public static <T> TypedFieldModel<T> required(Function<String, T> reader, Message whenBlank) {
    return new TypedFieldModel<>(reader, whenBlank);
  }

  /** Says the value back beside the field, in the other unit for example. */
  public TypedFieldModel<T> sayingBack(Function<T, String> how) {
    sayBack = how;
    read(typed.get());
    return this;
  }

  /** Warns of what is merely unusual; a warning never blocks. */
  public TypedFieldModel<T> warning(Function<T, List<Message>> how) {
    warn = how;
    read(typed.get());
    return this;
  }

  /** Puts a text in, as if nobody had looked at it yet. */
  public void fill(String text) {
    state.set(FieldState.NOT_LOOKED_AT);
    problem.set(Optional.empty());
    typed.set(text);
  }

  /**
   * Judges the text: it is about to be saved.
   *
   * @return whether it can be taken
   */
  public boolean look() {
    problem.set(fault);
    state.set(fault.isPresent() ? FieldState.INVALID : FieldState.VALID);
    return fault.isEmpty();
  }

  /** The field was left: judges what was typed; a blank is only blamed when it is to be saved. */
  public void leave() {
    if (!typed.get().isBlank()) {
      look();
    }
  }

  /** What the text means; empty for a blank and for what cannot be taken. */
  public Optional<T> value() {
    return value;
  }

  public StringProperty typedProperty() {
    return typed;
  }

  public ReadOnlyObjectProperty<FieldState> stateProperty() {
    return state.getReadOnlyProperty();
  }

  /** Why the text cannot be taken; present only while the state says so. */
  public ReadOnlyObjectProperty<Optional<Message>> problemProperty() {
    return problem.getReadOnlyProperty();
  }

  public ReadOnlyStringProperty saidBackProperty() {
    return saidBack.getReadOnlyProperty();
  }

  public ReadOnlyObjectProperty<List<Message>> warningsProperty() {
    return warnings.getReadOnlyProperty();
  }

  private void typedOn(String now) {
    read(now);
    if (state.get() == FieldState.INVALID) {
      look();
    } else if (fault.isPresent()) {
      state.set(FieldState.NOT_LOOKED_AT);
    }
  }

  private void read(String text) {
    value = Optional.empty();
    fault = Optional.empty();
    if (text.isBlank()) {
      fault = Optional.ofNullable(whenBlank);
    } else {
      try {
        value = Optional.of(reader.apply(text));
      } catch (Rejection rejected) {
        fault = Optional.of(rejected.reason());
      }
    }
    saidBack.set(value.map(sayBack).orElse(""));
    warnings.set(value.map(warn).orElse(List.of()));
  }
}
