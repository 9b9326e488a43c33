package sillet.desktop.instruments;

import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import sillet.logbook.text.Message;
import sillet.store.reading.Found;
import sillet.store.reading.InstrumentLine;

/**
 * What a search found. Answers come later than questions; an answer to a question that is no longer
 * asked is dropped.
 */
final class InstrumentsModel {
  private final ObservableList<InstrumentLine> lines = FXCollections.observableArrayList();
  private final ReadOnlyIntegerWrapper count = new ReadOnlyIntegerWrapper(this, "count", 0);
  private final ObjectProperty<Optional<Message>> trouble =
      new SimpleObjectProperty<>(this, "trouble", Optional.empty());
  private int question;
  private String answered = "";
  private boolean known;

  ObservableList<InstrumentLine> lines() {
    return lines;
  }

  /** How many there are in all, shown or not. */
  ReadOnlyIntegerProperty countProperty() {
    return count.getReadOnlyProperty();
  }

  /** Why nothing could be searched. */
  ObjectProperty<Optional<Message>> troubleProperty() {
    return trouble;
  }

  /** A new question is asked; its number goes with the answer. */
  int ask() {
    return ++question;
  }

  /** Takes an answer. */
  void answer(int number, String typed, Found<InstrumentLine> found) {
    if (number == question) {
      answered = typed;
      known = true;
      trouble.set(Optional.empty());
      count.set(found.count());
      lines.setAll(found.newest());
    }
  }

  /** Takes the news that there is no answer. */
  void failed(int number, Message why) {
    if (number == question) {
      trouble.set(Optional.of(why));
    }
  }

  /** What the head says of the list. */
  Message heading() {
    if (!known || count.get() == 0) {
      return Message.of("instruments.none-shown");
    }
    String all = Integer.toString(count.get());
    if (count.get() > lines.size()) {
      return Message.of("instruments.first", all, Integer.toString(lines.size()));
    }
    return answered.isBlank()
        ? Message.of("instruments.in-all", all)
        : Message.of("instruments.found", all);
  }

  /** What stands in place of an empty list. */
  Optional<Message> emptySentence() {
    if (!known || count.get() > 0) {
      return Optional.empty();
    }
    return Optional.of(
        answered.isBlank()
            ? Message.of("instruments.empty")
            : Message.of("instruments.nothing-found", answered.strip()));
  }
}
