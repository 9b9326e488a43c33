package sillet.desktop.sets;

import java.util.Arrays;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import sillet.acoustics.wire.Construction;
import sillet.desktop.controls.ConstructionNames;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.TypedCell;
import sillet.desktop.controls.TypedField;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** The fields of a set that is typed; at the end of each string what is wrong with it. */
final class SetEditor extends VBox {
  private final SetEditorModel model;
  private final Texts texts;
  private final TypedField name;
  private final GridPane grid = new GridPane();

  /**
   * The fields.
   *
   * @param model what is typed
   * @param texts the words
   * @param keep keeps the set
   * @param leave leaves it
   */
  SetEditor(SetEditorModel model, Texts texts, Runnable keep, Runnable leave) {
    this.model = model;
    this.texts = texts;
    Label head = new Label(texts.say(model.change() ? "sets.change-head" : "sets.new-head"));
    head.getStyleClass().add(Looks.PAGE_NAME);
    this.name = new TypedField(model.name(), texts.say("sets.name"), texts);
    name.input().setId("set-name-field");
    name.input().getStyleClass().add("set-name-field");
    TypedField count = new TypedField(model.count(), texts.say("sets.count"), texts);
    count.input().setId("set-count-field");
    count.input().getStyleClass().addAll(Looks.FIGURE, "newton-field");
    model.count().typedProperty().addListener((property, before, now) -> lines());
    grid.getStyleClass().add("set-editor-grid");
    Button keepIt = KeyHint.button(texts.say("sets.keep"), texts.say("sets.keep-key"), keep);
    keepIt.setId("keep-set-button");
    keepIt.getStyleClass().add(Looks.PRIMARY);
    Button leaveIt = KeyHint.button(texts.say("sets.leave"), texts.say("sets.leave-key"), leave);
    Label hint = new Label(texts.say("sets.editor-hint"));
    hint.getStyleClass().add(Looks.NOTE);
    hint.setWrapText(true);
    HBox buttons = new HBox(keepIt, leaveIt);
    buttons.getStyleClass().add("choice-line");
    getStyleClass().addAll(Looks.PANEL, "set-editor");
    getChildren().addAll(head, name, count, grid, hint, buttons);
    lines();
  }

  void focus() {
    name.input().requestFocus();
  }

  /** Puts the focus on the first field that cannot be taken. */
  void focusProblem() {
    for (Node field : lookupAll(".text-field")) {
      if (field.getPseudoClassStates().contains(Looks.ERROR)) {
        field.requestFocus();
        return;
      }
    }
  }

  private void lines() {
    grid.getChildren().clear();
    String[] heads = {
      texts.say("sets.string"),
      texts.say("sets.gauge-in"),
      texts.say("sets.construction"),
      texts.say("sets.core-in"),
      texts.say("sets.mass")
    };
    for (int column = 0; column < heads.length; column++) {
      Label head = new Label(heads[column]);
      head.getStyleClass().add(Looks.NOTE);
      head.setMinWidth(USE_PREF_SIZE);
      grid.add(head, column, 0);
    }
    int number = 1;
    for (SetLineModel line : model.lines()) {
      line(number++, line);
    }
  }

  private void line(int number, SetLineModel line) {
    String written = Integer.toString(number);
    Label string = new Label(written);
    string.getStyleClass().add(Looks.STRONG);
    Label said = new Label();
    said.getStyleClass().add(Looks.ERROR_HEAD);
    said.setWrapText(true);
    said.setMinWidth(0);
    said.setMinHeight(USE_PREF_SIZE);
    said.managedProperty().bind(said.textProperty().isNotEmpty());
    ComboBox<Construction> made = construction(number, line);
    TextField gauge = field(line.gauge(), "set-gauge-", written, texts.say("sets.gauge-in"));
    TextField core = field(line.core(), "set-core-", written, texts.say("sets.core-in"));
    TextField mass = field(line.mass(), "set-mass-", written, texts.say("sets.mass"));
    gauge
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                line.guessConstruction();
                made.setValue(line.construction());
              }
            });
    for (TypedFieldModel<Double> field : line.fields()) {
      field
          .problemProperty()
          .addListener(
              (property, before, now) -> said.setText(line.problem().map(texts::say).orElse("")));
    }
    grid.addRow(2 * number, string, gauge, made, core, mass);
    grid.add(said, 1, 2 * number + 1, 4, 1);
  }

  private TextField field(TypedFieldModel<?> model, String id, String number, String what) {
    TextField input = TypedCell.of(model);
    input.setId(id + number);
    input.getStyleClass().addAll(Looks.FIGURE, "set-figure-field");
    input.setAccessibleText(texts.say("sets.cell", number, what));
    return input;
  }

  private ComboBox<Construction> construction(int number, SetLineModel line) {
    ComboBox<Construction> box = new ComboBox<>();
    box.setId("set-made-" + number);
    box.getStyleClass().add("set-made-field");
    box.getItems().setAll(Arrays.asList(Construction.values()));
    box.setConverter(new ConstructionNames());
    box.setValue(line.construction());
    box.setAccessibleText(
        texts.say("sets.cell", Integer.toString(number), texts.say("sets.construction")));
    box.setOnAction(
        chosen -> {
          if (box.getValue() != null && box.getValue() != line.construction()) {
            line.construction(box.getValue());
          }
        });
    return box;
  }
}
