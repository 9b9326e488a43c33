package sillet.desktop.start;

import java.util.List;
import java.util.Map;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextArea;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Ask;
import sillet.desktop.controls.Columns;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Narrow;
import sillet.desktop.controls.Screen;
import sillet.desktop.controls.TypedField;
import sillet.desktop.drawing.Perforation;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;

/** Three lines, then the bench; or a look at the demo; or a logbook that exists. */
public final class StartScreen implements Screen {
  private final StartModel model;
  private final Ways ways;
  private final Ask ask;
  private final Texts texts;
  private final TypedField name;
  private final ScrollPane page;

  /**
   * A first start.
   *
   * @param model the three lines
   * @param ways where one can go from here
   * @param ask picks a file
   * @param texts the words
   * @param place where the new logbook will lie
   */
  public StartScreen(StartModel model, Ways ways, Ask ask, Texts texts, String place) {
    this.model = model;
    this.ways = ways;
    this.ask = ask;
    this.texts = texts;
    this.name = new TypedField(model.name(), texts.say("start.name"), texts);
    name.input().setId("shop-name");
    VBox content = new VBox();
    Narrow narrow = new Narrow(content);
    content.getChildren().addAll(heading(place), columns(narrow), narrow.measure());
    content.getStyleClass().add("start-page");
    this.page = new ScrollPane(content);
    page.setFitToWidth(true);
    page.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    page.disableProperty().bind(model.busyProperty());
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    name.input().requestFocus();
  }

  @Override
  public void left() {
    // nothing typed here outlives the screen: the shop is saved, or it is not begun
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(
        key(KeyCode.ENTER), this::begin,
        key(KeyCode.D), ways::demo,
        key(KeyCode.O), this::open);
  }

  private void begin() {
    model.shop().ifPresent(ways::begin);
  }

  private void open() {
    ask.fileToOpen().ifPresent(ways::open);
  }

  private static KeyCombination key(KeyCode code) {
    return new KeyCodeCombination(code, KeyCombination.SHORTCUT_DOWN);
  }

  private HBox heading(String place) {
    Label program = new Label(texts.say("start.program"));
    program.getStyleClass().add("start-name");
    Label promise = new Label(texts.say("start.promise", place));
    program.setMinWidth(Region.USE_PREF_SIZE);
    promise.getStyleClass().add(Looks.SOFT);
    promise.setMinWidth(0);
    promise.setWrapText(true);
    HBox line = new HBox(program, promise);
    line.getStyleClass().add("start-heading");
    return line;
  }

  private Columns columns(Narrow narrow) {
    Columns columns = new Columns(narrow.narrowProperty(), 65, 35);
    columns.show(ticket(), new StartBeside(texts, ways::demo, this::open, model));
    columns.getStyleClass().add("start-columns");
    return columns;
  }

  private GridPane ticket() {
    GridPane grid = new GridPane();
    grid.getStyleClass().addAll(Looks.PANEL, "start-ticket");
    ColumnConstraints stub = new ColumnConstraints();
    stub.setHgrow(Priority.NEVER);
    ColumnConstraints tear = new ColumnConstraints();
    ColumnConstraints body = new ColumnConstraints();
    body.setHgrow(Priority.ALWAYS);
    grid.getColumnConstraints().addAll(stub, tear, body);
    Perforation perforation = new Perforation();
    grid.add(perforation, 1, 0, 1, 3);
    step(grid, 0, "start.step-1", shop());
    step(grid, 1, "start.step-2", units());
    step(grid, 2, "start.step-3", people());
    return grid;
  }

  private void step(GridPane grid, int row, String number, VBox content) {
    Label figure = new Label(texts.say(number));
    figure.getStyleClass().addAll(Looks.TICKET_NUMBER, "start-step");
    content.getStyleClass().add("start-line");
    if (row > 0) {
      content.getStyleClass().add(Looks.RULE_ABOVE);
    }
    grid.add(figure, 0, row);
    GridPane.setValignment(figure, VPos.TOP);
    grid.add(content, 2, row);
  }

  private VBox shop() {
    return new VBox(head("start.shop"), name);
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

  private VBox people() {
    Label label = new Label(texts.say("start.technicians"));
    label.getStyleClass().add(Looks.TIGHT);
    TextArea area = new TextArea();
    area.setId("technicians");
    area.setPrefRowCount(3);
    area.textProperty().bindBidirectional(model.techniciansProperty());
    label.setLabelFor(area);
    VBox field = new VBox(label, area);
    field.getStyleClass().add("typed-field");
    Button go = KeyHint.button(texts.say("start.begin"), texts.say("start.begin-key"), this::begin);
    go.setId("begin");
    go.getStyleClass().add(Looks.PRIMARY);
    Label wait = new Label(texts.say("start.can-wait"));
    wait.getStyleClass().add(Looks.SOFT);
    FlowPane line = new FlowPane(go, wait);
    line.getStyleClass().add("choice-flow");
    return new VBox(head("start.people"), field, line);
  }

  private Label head(String key) {
    Label head = new Label(texts.say(key));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    return head;
  }
}
