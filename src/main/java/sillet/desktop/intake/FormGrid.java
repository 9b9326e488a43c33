package sillet.desktop.intake;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.stream.Collectors;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.control.TextInputControl;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/** A form: on each line a name, a field, and beside it what is to be said of it. */
final class FormGrid extends GridPane {
  private final Texts texts;
  private int lines;

  FormGrid(Texts texts) {
    this.texts = texts;
    getStyleClass().add("form");
    ColumnConstraints names = new ColumnConstraints();
    names.setMinWidth(Region.USE_PREF_SIZE);
    ColumnConstraints fields = new ColumnConstraints();
    fields.setMinWidth(Region.USE_PREF_SIZE);
    ColumnConstraints said = new ColumnConstraints();
    said.setHgrow(Priority.ALWAYS);
    getColumnConstraints().addAll(names, fields, said);
  }

  /** A line with a field for words. */
  TextField words(TypedFieldModel<?> model, String name, String id) {
    TextField field = new TextField();
    bind(model, field, id);
    line(name, field);
    span(field);
    below(model, field);
    return field;
  }

  /** A line with a field for words and something under it. */
  TextField words(
      TypedFieldModel<?> model, String name, String id, Function<TextField, Node> under) {
    TextField field = new TextField();
    bind(model, field, id);
    VBox both = new VBox(field, under.apply(field));
    line(name, both);
    span(both);
    field.setAccessibleText(name);
    below(model, field);
    return field;
  }

  /** A line with a field for a figure, and beside it the figure in another unit. */
  TextField figure(TypedFieldModel<?> model, String name, String id) {
    TextField field = new TextField();
    field.getStyleClass().add("figure-field");
    bind(model, field, id);
    line(name, field);
    beside(model);
    below(model, field);
    return field;
  }

  /** A line with an area for sentences. */
  void sentences(TypedFieldModel<?> model, String name, String id, TextArea area) {
    bind(model, area, id);
    line(name, area);
    span(area);
    below(model, area);
  }

  /** A line with a figure that can be chosen or typed. */
  ComboBox<String> typedChoice(
      TypedFieldModel<?> model, String name, String id, List<String> offered) {
    ComboBox<String> box = new ComboBox<>();
    box.setEditable(true);
    box.getItems().setAll(offered);
    box.setId(id);
    box.getStyleClass().add("figure-field");
    box.getEditor().textProperty().bindBidirectional(model.typedProperty());
    line(name, box);
    beside(model);
    below(model, box.getEditor());
    return box;
  }

  /** A line with a choice. */
  <T> ComboBox<T> choice(
      String name, String id, List<T> all, Function<T, String> words, Consumer<T> chosen) {
    ComboBox<T> box = new ComboBox<>();
    box.getItems().setAll(all);
    box.setConverter(new Spoken<>(words));
    box.setId(id);
    box.setMaxWidth(Double.MAX_VALUE);
    box.valueProperty()
        .addListener(
            (property, before, now) -> {
              if (now != null) {
                chosen.accept(now);
              }
            });
    line(name, box);
    span(box);
    lines++;
    return box;
  }

  /** A line with a box to tick. */
  void tick(String name, CheckBox box) {
    line(name, box);
    lines++;
  }

  /** A node over the whole width. */
  void wide(Node node) {
    add(node, 0, lines, 3, 1);
    lines++;
  }

  /** Shows or hides the line of an input. */
  static void shows(Node input, boolean wanted) {
    GridPane form = (GridPane) input.getParent();
    Integer line = GridPane.getRowIndex(input);
    for (Node node : form.getChildren()) {
      if (line.equals(GridPane.getRowIndex(node))) {
        node.setVisible(wanted);
        node.setManaged(wanted);
      }
    }
  }

  private static void bind(TypedFieldModel<?> model, TextInputControl input, String id) {
    input.setId(id);
    input.textProperty().bindBidirectional(model.typedProperty());
  }

  private void line(String name, Node input) {
    Label label = new Label(name);
    label.getStyleClass().addAll(Looks.TIGHT, "form-name");
    label.setLabelFor(input);
    input.setAccessibleText(name);
    setValignment(label, VPos.TOP);
    addRow(lines, label, input);
  }

  private static void span(Node input) {
    setColumnSpan(input, 2);
    setHgrow(input, Priority.ALWAYS);
  }

  /** The value said back, at the end of its line. */
  private void beside(TypedFieldModel<?> model) {
    Label said = new Label();
    said.getStyleClass().add(Looks.NOTE);
    said.setWrapText(true);
    said.textProperty().bind(model.saidBackProperty());
    add(said, 2, lines);
  }

  /** What is wrong or unusual, on a line of its own under the field. */
  private void below(TypedFieldModel<?> model, TextInputControl input) {
    Label said = new Label();
    said.getStyleClass().setAll("label", Looks.ERROR_HEAD);
    said.setWrapText(true);
    said.setMinHeight(Region.USE_PREF_SIZE);
    add(said, 1, lines + 1, 2, 1);
    lines += 2;
    input
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                model.leave();
              }
            });
    model.problemProperty().addListener((property, before, now) -> say(model, input, said));
    model.warningsProperty().addListener((property, before, now) -> say(model, input, said));
    say(model, input, said);
  }

  private void say(TypedFieldModel<?> model, TextInputControl input, Label said) {
    Optional<Message> problem = model.problemProperty().get();
    input.pseudoClassStateChanged(Looks.ERROR, problem.isPresent());
    said.setText(
        problem
            .map(texts::say)
            .orElseGet(
                () ->
                    model.warningsProperty().get().stream()
                        .map(texts::say)
                        .collect(Collectors.joining("\n"))));
    boolean any = !said.getText().isEmpty();
    said.setVisible(any);
    said.setManaged(any);
    input.setAccessibleHelp(said.getText());
  }

  /** Shows a choice in words; nothing is ever typed into it. */
  private static final class Spoken<T> extends StringConverter<T> {
    private final Function<T, String> words;

    Spoken(Function<T, String> words) {
      this.words = words;
    }

    @Override
    public String toString(T choice) {
      return choice == null ? "" : words.apply(choice);
    }

    @Override
    public T fromString(String typed) {
      throw new UnsupportedOperationException("a choice is not typed: " + typed);
    }
  }
}
