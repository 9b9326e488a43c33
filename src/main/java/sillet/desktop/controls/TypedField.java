package sillet.desktop.controls;

import java.util.Objects;
import java.util.Optional;
import java.util.stream.Collectors;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.TextInputControl;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import sillet.desktop.drawing.Leader;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/**
 * A label, a field, and beside the field what is to be said of it: the value in the other unit, a
 * warning, or why it cannot be taken, joined to the field by a leader. A problem's first line is
 * the rule, further lines say what was read.
 */
public final class TypedField extends VBox {
  private static final String SHEET = sheet();

  private final TypedFieldModel<?> model;
  private final Texts texts;
  private final TextInputControl input;
  private final Label head = new Label();
  private final Label detail = new Label();
  private final Leader leader = new Leader();

  /**
   * A field of one line.
   *
   * @param model what is typed and what it means
   * @param name what stands above the field
   * @param texts the words of its messages
   */
  public TypedField(TypedFieldModel<?> model, String name, Texts texts) {
    this(model, name, texts, new TextField());
  }

  /** A field with an input of the screen's choice, a text area for example. */
  public TypedField(TypedFieldModel<?> model, String name, Texts texts, TextInputControl input) {
    this.model = model;
    this.texts = texts;
    this.input = input;
    Label label = new Label(name);
    label.getStyleClass().add(Looks.TIGHT);
    label.setLabelFor(input);
    input.setAccessibleText(name);
    VBox said = new VBox(head, detail);
    said.setAlignment(Pos.CENTER_LEFT);
    said.setMinWidth(0);
    head.setWrapText(true);
    detail.setWrapText(true);
    HBox row = new HBox(input, leader, said);
    row.getStyleClass().add("field-row");
    row.setAlignment(Pos.CENTER_LEFT);
    HBox.setHgrow(said, Priority.ALWAYS);
    getStyleClass().add("typed-field");
    getStylesheets().add(SHEET);
    getChildren().addAll(label, row);
    listen();
  }

  /** Where one types. */
  public TextInputControl input() {
    return input;
  }

  private void listen() {
    input.textProperty().bindBidirectional(model.typedProperty());
    input
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                model.leave();
              }
            });
    model.problemProperty().addListener((property, before, now) -> say());
    model.saidBackProperty().addListener((property, before, now) -> say());
    model.warningsProperty().addListener((property, before, now) -> say());
    say();
  }

  private void say() {
    Optional<Message> problem = model.problemProperty().get();
    input.pseudoClassStateChanged(Looks.ERROR, problem.isPresent());
    leader.setVisible(problem.isPresent());
    String warned =
        model.warningsProperty().get().stream().map(texts::say).collect(Collectors.joining("\n"));
    String whole = problem.map(texts::say).orElse(model.saidBackProperty().get());
    int end = whole.indexOf('\n');
    head.setText(end < 0 ? whole : whole.substring(0, end));
    detail.setText(problem.isEmpty() ? warned : end < 0 ? "" : whole.substring(end + 1));
    head.getStyleClass().setAll("label", problem.isPresent() ? Looks.ERROR_HEAD : Looks.NOTE);
    detail.getStyleClass().setAll("label", Looks.ERROR_DETAIL);
    for (Label line : new Label[] {head, detail}) {
      line.setManaged(!line.getText().isEmpty());
    }
    input.setAccessibleHelp((head.getText() + " " + detail.getText()).strip());
  }

  private static String sheet() {
    var place = TypedField.class.getResource("/sillet/desktop/fields.css");
    return Objects.requireNonNull(place, "fields.css is missing from the program").toExternalForm();
  }
}
