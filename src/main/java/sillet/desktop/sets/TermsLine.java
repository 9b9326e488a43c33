package sillet.desktop.sets;

import java.util.Optional;
import java.util.stream.Stream;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/** The tuning and scale a set is reckoned at, typed in one line; what is wrong stands under it. */
final class TermsLine extends VBox {
  private final SetsModel model;
  private final Texts texts;
  private final TextField tuning = new TextField();
  private final TextField scale = new TextField();
  private final Label said = new Label();
  private final Label problem = new Label();
  private final String reference;

  /**
   * The line.
   *
   * @param model of the drawer
   * @param texts the words
   * @param reference what A4 is here, in figures
   * @param changed called when tuning or scale change
   */
  TermsLine(SetsModel model, Texts texts, String reference, Runnable changed) {
    this.model = model;
    this.texts = texts;
    this.reference = reference;
    tuning.setId("sets-tuning");
    scale.setId("sets-scale");
    scale.getStyleClass().add(Looks.FIGURE);
    said.getStyleClass().add(Looks.NOTE);
    said.setMinWidth(USE_PREF_SIZE);
    problem.setId("sets-terms-problem");
    problem.getStyleClass().add(Looks.ERROR_HEAD);
    problem.setWrapText(true);
    HBox.setHgrow(tuning, Priority.ALWAYS);
    HBox line =
        new HBox(name("sets.tuning", tuning), tuning, name("sets.scale", scale), scale, said);
    line.getStyleClass().add("terms-line");
    getStyleClass().add("terms");
    getChildren().addAll(line, problem);
    bind(model.tuning(), tuning, changed);
    bind(model.scale(), scale, changed);
    say();
  }

  private Label name(String key, TextField field) {
    Label name = new Label(texts.say(key));
    name.getStyleClass().add(Looks.NOTE);
    name.setMinWidth(USE_PREF_SIZE);
    name.setLabelFor(field);
    field.setAccessibleText(name.getText());
    return name;
  }

  private void bind(TypedFieldModel<?> field, TextField input, Runnable changed) {
    input.textProperty().bindBidirectional(field.typedProperty());
    // the model has read the text by then, which the input's own listeners cannot rely on
    field
        .typedProperty()
        .addListener(
            (property, before, now) -> {
              say();
              changed.run();
            });
    input
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                field.look();
              }
            });
    field
        .problemProperty()
        .addListener(
            (property, before, now) -> {
              input.pseudoClassStateChanged(Looks.ERROR, now.isPresent());
              say();
            });
  }

  private void say() {
    said.setText(
        texts.say("sets.reference", reference, model.scale().saidBackProperty().get()).strip());
    Optional<Message> why =
        Stream.of(model.tuning(), model.scale())
            .flatMap(field -> field.problemProperty().get().stream())
            .findFirst();
    problem.setText(why.map(texts::say).orElse(""));
    problem.setVisible(why.isPresent());
    problem.setManaged(why.isPresent());
  }
}
