package sillet.desktop.drawing;

import java.util.List;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.Parent;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;

/** All marks and the states of a reading cell on one sheet. */
final class KeySheet {
  private KeySheet() {}

  static Parent build() {
    VBox sheet = new VBox(10, marks(), cells(), error(), lines(), buttons(), sections());
    sheet.getStyleClass().add(Looks.PANEL);
    return sheet;
  }

  private static GridPane marks() {
    GridPane grid = new GridPane();
    grid.setHgap(16);
    grid.setVgap(4);
    int row = 0;
    for (MarkShape shape : MarkShape.values()) {
      grid.addRow(row++, new Mark(shape, shape.name()), word(shape), Mark.small(shape, ""));
    }
    grid.addRow(
        row,
        new Balloon(1, false, "finding"),
        new Label("nut slot high"),
        new Balloon(12, false, ""));
    grid.addRow(row + 1, new Balloon(1, true, "finding"), new Label("dealt with"));
    grid.addRow(row + 2, new NoteName("F#3", false), new NoteName("Bb2", true));
    return grid;
  }

  private static Label word(MarkShape shape) {
    Label word = new Label(shape.name());
    boolean pencil = shape == MarkShape.OUTSIDE_ABOVE || shape == MarkShape.READ_AGAIN;
    word.getStyleClass().add(pencil ? Looks.NEEDS_HAND : Looks.STRONG);
    return word;
  }

  private static GridPane cells() {
    GridPane grid = new GridPane();
    grid.setHgap(24);
    grid.setVgap(8);
    grid.addRow(0, cell("", Looks.UNREAD), cell("+5.0", null), cell("+6.1", Looks.STALE));
    TextField lit = cell("+5.0", PseudoClass.getPseudoClass("focused"));
    grid.add(lit, 3, 0);
    TextField wrong = cell("31o", Looks.ERROR);
    wrong.pseudoClassStateChanged(PseudoClass.getPseudoClass("focused"), true);
    grid.add(wrong, 3, 1);
    grid.addRow(1, tries("+2.8", -1), tries("+3.1", 2), cell("31o", Looks.ERROR));
    return grid;
  }

  private static TextField cell(String text, PseudoClass state) {
    TextField field = new TextField(text);
    field.getStyleClass().add(Looks.READING_CELL);
    field.setPrefWidth(84);
    if (state != null) {
      field.pseudoClassStateChanged(state, true);
    }
    return field;
  }

  private static StackPane tries(String text, int wild) {
    Tries bars = new Tries(3, wild, "three tries");
    StackPane pane = new StackPane(cell(text, null), bars);
    bars.setMaxSize(bars.prefWidth(-1), bars.prefHeight(-1));
    StackPane.setAlignment(bars, Pos.CENTER_LEFT);
    bars.setTranslateX(6);
    return pane;
  }

  private static HBox error() {
    Label head = new Label("\u201co\u201d is no figure.");
    head.getStyleClass().add(Looks.ERROR_HEAD);
    Label detail = new Label("Cents like 3.1 or 3.1 2.8 3.3");
    detail.getStyleClass().add(Looks.ERROR_DETAIL);
    HBox row = new HBox(cell("31o", Looks.ERROR), new Leader(), new VBox(head, detail));
    row.setAlignment(Pos.CENTER_LEFT);
    return row;
  }

  private static HBox lines() {
    StringTally tally =
        new StringTally(
            List.of(
                StringTally.State.DONE,
                StringTally.State.TO_MOVE,
                StringTally.State.UNREAD,
                StringTally.State.STALE),
            "four strings");
    return new HBox(
        16,
        new LimitLine(new LimitLine.Values(0.2, 0.3, 0.31, 0.22), "inside"),
        new LimitLine(new LimitLine.Values(0.25, 0.4, 0.52, 0.52), "outside"),
        new LimitLine(new LimitLine.Values(null, null, 2.4, 2.4), "no target"),
        tally);
  }

  private static HBox buttons() {
    Button primary = button("Now do", "F8");
    primary.getStyleClass().add(Looks.PRIMARY);
    Button off = button("Sign off", "Ctrl Enter");
    off.setDisable(true);
    return new HBox(12, primary, button("Log work", "Ctrl L"), off);
  }

  private static Button button(String name, String key) {
    Label hint = new Label(key);
    hint.getStyleClass().add(Looks.KEY_HINT);
    Button button = new Button(name, hint);
    button.setContentDisplay(javafx.scene.control.ContentDisplay.RIGHT);
    return button;
  }

  private static HBox sections() {
    Button arrival = new Button("Arrival", Mark.small(MarkShape.DONE, "done"));
    Button checks = new Button("Checks", Mark.small(MarkShape.OUTSIDE_ABOVE, "outside"));
    Button readings = new Button("Readings", Mark.small(MarkShape.MOVE, "to move"));
    readings.pseudoClassStateChanged(Looks.CURRENT, true);
    HBox row = new HBox(24, arrival, checks, readings);
    for (Button word : List.of(arrival, checks, readings)) {
      word.getStyleClass().add(Looks.SECTION_WORD);
      word.setContentDisplay(javafx.scene.control.ContentDisplay.RIGHT);
    }
    return row;
  }
}
