package sillet.desktop.visit.checks;

import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/** A field of a table: Enter goes down its column, leaving it saves. */
final class CheckCell extends TextField {
  private final TypedFieldModel<?> model;
  private Runnable next = () -> {};

  /**
   * A field.
   *
   * @param model what is typed and what it means
   * @param name for screen readers
   * @param done called when the field is left or Enter was pressed
   */
  CheckCell(TypedFieldModel<?> model, String name, Runnable done) {
    this.model = model;
    setAccessibleText(name);
    getStyleClass().addAll(Looks.READING_CELL, "check-cell");
    textProperty().bindBidirectional(model.typedProperty());
    textProperty().addListener((property, before, now) -> show());
    model.problemProperty().addListener((property, before, now) -> show());
    focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (now) {
                selectAll();
              } else {
                model.leave();
                done.run();
              }
            });
    addEventFilter(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ENTER && !event.isShortcutDown()) {
            model.leave();
            done.run();
            next.run();
            event.consume();
          }
        });
    show();
  }

  /** What Enter goes to. */
  void then(Runnable after) {
    next = after;
  }

  private void show() {
    pseudoClassStateChanged(Looks.UNREAD, getText().isBlank());
    pseudoClassStateChanged(Looks.ERROR, model.problemProperty().get().isPresent());
  }

  /**
   * What is to be said of it: why it cannot be taken, or its value in the other unit and warnings.
   */
  String said(Texts texts) {
    Optional<Message> problem = model.problemProperty().get();
    if (problem.isPresent()) {
      return texts.say(problem.get());
    }
    return Stream.concat(
            Stream.of(model.saidBackProperty().get()),
            model.warningsProperty().get().stream().map(texts::say))
        .filter(line -> !line.isEmpty())
        .collect(Collectors.joining(" "));
  }

  /** True if it must be looked at again: an error or a warning. */
  boolean doubtful() {
    return model.problemProperty().get().isPresent() || !model.warningsProperty().get().isEmpty();
  }
}
