package sillet.desktop.start;

import java.util.List;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.RowConstraints;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.TypedField;
import sillet.desktop.drawing.Perforation;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;

/** The three lines of a shop, on a sheet with a stub like a ticket's. */
final class ShopForm extends GridPane {
  private final StartModel model;
  private final Texts texts;
  private final TypedField name;

  /**
   * The three lines.
   *
   * @param model what is typed
   * @param texts the words
   * @param below what stands under the third line
   */
  ShopForm(StartModel model, Texts texts, Node... below) {
    this.model = model;
    this.texts = texts;
    this.name = new TypedField(model.name(), texts.say("start.name"), texts);
    name.input().setId("shop-name");
    layOut(below);
  }

  void focus() {
    name.input().requestFocus();
  }

  private void layOut(Node... below) {
    getStyleClass().addAll(Looks.PANEL, "start-ticket");
    ColumnConstraints stub = new ColumnConstraints();
    stub.setHgrow(Priority.NEVER);
    ColumnConstraints tear = new ColumnConstraints();
    ColumnConstraints body = new ColumnConstraints();
    body.setHgrow(Priority.ALWAYS);
    getColumnConstraints().addAll(stub, tear, body);
    RowConstraints last = new RowConstraints();
    last.setVgrow(Priority.ALWAYS);
    last.setValignment(VPos.TOP);
    getRowConstraints().addAll(new RowConstraints(), new RowConstraints(), last);
    Perforation perforation = new Perforation();
    add(perforation, 1, 0, 1, 3);
    step(0, "start.step-1", new VBox(head("start.shop"), name));
    step(1, "start.step-2", units());
    step(2, "start.step-3", people(below));
  }

  private void step(int row, String number, VBox content) {
    Label figure = new Label(texts.say(number));
    figure.getStyleClass().addAll(Looks.TICKET_NUMBER, "start-step");
    content.getStyleClass().add("start-line");
    if (row > 0) {
      content.getStyleClass().add(Looks.RULE_ABOVE);
    }
    add(figure, 0, row);
    setValignment(figure, VPos.TOP);
    add(content, 2, row);
  }

  private VBox units() {
    Label lengths = new Label(texts.say("start.lengths"));
    lengths.getStyleClass().add(Looks.TIGHT);
    TypedField pitch = new TypedField(model.referenceHz(), texts.say("start.reference"), texts);
    pitch.input().setId("reference-hz");
    pitch.input().getStyleClass().addAll(Looks.FIGURE, "short-field");
    VBox choice = new VBox(lengths, unitChoice());
    choice.getStyleClass().add("typed-field");
    return new VBox(head("start.units"), choice, pitch);
  }

  private FlowPane unitChoice() {
    ToggleGroup group = new ToggleGroup();
    FlowPane line = new FlowPane();
    line.getStyleClass().add("choice-flow");
    for (LengthUnit unit : List.of(LengthUnit.values())) {
      ToggleButton button = new ToggleButton(texts.say(unitKey(unit)));
      button.setId("unit-" + unit.word());
      button.getStyleClass().add(Looks.CHOICE);
      button.setToggleGroup(group);
      button.setSelected(unit == model.lengthUnitProperty().get());
      // a choice stays made: pressing the chosen one again does not leave nothing chosen
      button.setOnAction(
          pressed -> {
            button.setSelected(true);
            model.lengthUnitProperty().set(unit);
          });
      line.getChildren().add(button);
    }
    return line;
  }

  private static String unitKey(LengthUnit unit) {
    return switch (unit) {
      case MM -> "start.unit-mm";
      case INCH -> "start.unit-inch";
      case SIXTY_FOURTHS -> "start.unit-64ths";
      case THOUSANDTHS -> "start.unit-thousandths";
    };
  }

  private VBox people(Node... below) {
    Label label = new Label(texts.say("start.technicians"));
    label.getStyleClass().add(Looks.TIGHT);
    TextArea area = new TextArea();
    area.setId("technicians");
    area.setPrefRowCount(3);
    area.textProperty().bindBidirectional(model.techniciansProperty());
    label.setLabelFor(area);
    VBox field = new VBox(label, area);
    field.getStyleClass().add("typed-field");
    FlowPane line = new FlowPane(below);
    line.getStyleClass().add("choice-flow");
    return new VBox(head("start.people"), field, line);
  }

  private Label head(String key) {
    Label head = new Label(texts.say(key));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    return head;
  }
}
