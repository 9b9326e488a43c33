package sillet.desktop.theme;

import java.util.List;
import javafx.beans.property.SimpleStringProperty;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.Parent;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.DatePicker;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.RadioButton;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The controls of the program on one page, in the states they can be in. */
final class ControlsSheet {
  private static final PseudoClass FOCUSED = PseudoClass.getPseudoClass("focused");

  private ControlsSheet() {}

  static Parent build() {
    HBox middle = new HBox(8, lists(), fields(), choices());
    VBox.setVgrow(middle, Priority.ALWAYS);
    VBox page = new VBox(places(), head(), middle);
    page.getStyleClass().add(Looks.PAGE);
    return page;
  }

  private static Label label(String text, String... looks) {
    Label label = new Label(text);
    label.getStyleClass().addAll(looks);
    return label;
  }

  private static HBox places() {
    HBox line = new HBox(22);
    for (String name : List.of("Bench", "Instruments", "Customers", "String sets", "Shop")) {
      Button place = new Button(name);
      place.getStyleClass().add(Looks.PLACE_WORD);
      place.pseudoClassStateChanged(Looks.CURRENT, name.equals("Bench"));
      place.pseudoClassStateChanged(FOCUSED, name.equals("Customers"));
      line.getChildren().add(place);
    }
    TextField search = new TextField();
    search.setPromptText("Customer, phone, serial, tag, ticket");
    HBox.setHgrow(search, Priority.ALWAYS);
    line.getChildren().addAll(search, label("Noor"));
    line.setAlignment(Pos.CENTER_LEFT);
    return line;
  }

  private static HBox head() {
    VBox stub = new VBox(label("Ticket", Looks.NOTE), label("2417", Looks.TICKET_NUMBER));
    stub.getStyleClass().add(Looks.TICKET_STUB);
    VBox name =
        new VBox(
            4,
            label("Ottersby Fieldfare", Looks.PAGE_NAME),
            label("Serial 0382 \u00b7 six strings, 648 mm", Looks.TIGHT, Looks.SOFT),
            label("\u201cSour past the seventh fret.\u201d", Looks.TIGHT, Looks.CUSTOMER_WORDS));
    Region room = new Region();
    HBox.setHgrow(room, Priority.ALWAYS);
    Button now = new Button("Now do", label("F8", Looks.KEY_HINT));
    now.setContentDisplay(ContentDisplay.RIGHT);
    now.getStyleClass().add(Looks.PRIMARY);
    now.pseudoClassStateChanged(FOCUSED, true);
    HBox head = new HBox(16, stub, name, room, now);
    head.setAlignment(Pos.CENTER_LEFT);
    head.getStyleClass().add(Looks.PANEL);
    return head;
  }

  private static VBox lists() {
    ListView<String> list = new ListView<>();
    list.getItems().addAll("Light electric", "Medium electric", "Flat-wound", "Nylon, normal");
    list.getSelectionModel().select(1);
    list.setPrefHeight(190);
    TableView<String> table = new TableView<>();
    table.getItems().addAll("Relief, fret 8", "Action 12, string 1", "Action 12, string 6");
    for (String name : List.of("check", "as left")) {
      TableColumn<String, String> column = new TableColumn<>(name);
      column.setCellValueFactory(row -> new SimpleStringProperty(row.getValue()));
      column.setPrefWidth(170);
      table.getColumns().add(column);
    }
    table.getSelectionModel().select(1);
    table.setPrefHeight(170);
    VBox panel = new VBox(8, label("String sets", Looks.PANEL_HEAD), list, table);
    panel.getStyleClass().add(Looks.PANEL);
    return panel;
  }

  private static VBox fields() {
    TextField plain = new TextField("Quay Street Strings");
    TextField lit = new TextField("lit");
    lit.pseudoClassStateChanged(FOCUSED, true);
    TextField wrong = new TextField("44");
    wrong.pseudoClassStateChanged(Looks.ERROR, true);
    TextField off = new TextField("cannot be changed");
    off.setDisable(true);
    TextArea area = new TextArea("Noor\nEdda");
    area.setPrefRowCount(3);
    ScrollPane scroll =
        new ScrollPane(new VBox(label("one"), label("two"), label("three\n\n\n\n")));
    scroll.setPrefHeight(60);
    VBox panel =
        new VBox(
            10,
            label("The shop", Looks.PANEL_HEAD),
            plain,
            lit,
            wrong,
            label("Must lie between 400 and 480 Hz.", Looks.ERROR_HEAD),
            label("44 was read. Did you mean 440?", Looks.ERROR_DETAIL),
            off,
            area,
            scroll);
    panel.getStyleClass().add(Looks.PANEL);
    return panel;
  }

  private static VBox choices() {
    ToggleButton mm = new ToggleButton("mm");
    mm.setSelected(true);
    ToggleButton inch = new ToggleButton("inch, decimal");
    for (ToggleButton choice : List.of(mm, inch)) {
      choice.getStyleClass().add(Looks.CHOICE);
    }
    ComboBox<String> combo = new ComboBox<>();
    combo.getItems().addAll("wound nickel", "plain steel");
    combo.getSelectionModel().select(0);
    ComboBox<String> litCombo = new ComboBox<>();
    litCombo.setEditable(true);
    litCombo.pseudoClassStateChanged(FOCUSED, true);
    CheckBox check = new CheckBox("Glide saddle targets");
    check.setSelected(true);
    CheckBox litCheck = new CheckBox("Keep the screen on");
    litCheck.pseudoClassStateChanged(FOCUSED, true);
    RadioButton radio = new RadioButton("against the open string");
    radio.setSelected(true);
    Button lit = new Button("Log work");
    lit.pseudoClassStateChanged(FOCUSED, true);
    Button off = new Button("Sign off");
    off.setDisable(true);
    VBox panel =
        new VBox(
            10,
            new HBox(8, mm, inch),
            combo,
            litCombo,
            new DatePicker(),
            check,
            litCheck,
            radio,
            new HBox(12, lit, off),
            new ProgressBar(0.4),
            label("Cut little, read often. Slacken first.", Looks.CAUTION));
    panel.getStyleClass().add(Looks.PANEL);
    return panel;
  }
}
