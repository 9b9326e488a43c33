package sillet.desktop.visit.checks;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** The table of the room at the saddles: a column a string, as they lie. */
public final class RoomPanel extends VBox {
  private final RoomModel model;
  private final Texts texts;
  private final Consumer<RoomRow> save;
  private final GridPane table = new GridPane();
  private final Label said = new Label();

  /**
   * A table.
   *
   * @param model the room
   * @param texts the words
   * @param save called when a field of a row is done
   */
  public RoomPanel(RoomModel model, Texts texts, Consumer<RoomRow> save) {
    this.model = model;
    this.texts = texts;
    this.save = save;
    Label name = new Label(texts.say("visit.room"));
    name.getStyleClass().add(Looks.PANEL_HEAD);
    Label unit = new Label(texts.say("visit.room.unit"));
    unit.getStyleClass().add(Looks.SOFT);
    HBox head = new HBox(name, unit);
    head.getStyleClass().add("panel-line");
    table.getStyleClass().add("room-table");
    said.getStyleClass().add(Looks.NOTE);
    said.setManaged(false);
    getStyleClass().addAll(Looks.PANEL, "room");
    getChildren().addAll(head, table, said);
    if (model.onePiece()) {
      Label edges = new Label(texts.say("visit.room.edges"));
      edges.getStyleClass().add(Looks.NOTE);
      edges.setWrapText(true);
      edges.setMinHeight(USE_PREF_SIZE);
      getChildren().add(edges);
    }
    make(true);
  }

  /** Makes the fields anew. */
  public void make(boolean editable) {
    table.getChildren().clear();
    head(texts.say("visit.room.string"), 0);
    head(texts.say("visit.room.back"), 1);
    head(texts.say("visit.room.forward"), 2);
    List<CheckCell> backs = new ArrayList<>();
    List<CheckCell> forwards = new ArrayList<>();
    int column = 1;
    for (RoomRow row : model.rows()) {
      Label number = new Label(Integer.toString(row.string()));
      number.getStyleClass().addAll(Looks.STRONG, "room-number");
      table.add(number, column, 0);
      backs.add(cell(row, true, editable));
      forwards.add(cell(row, false, editable));
      table.add(backs.get(column - 1), column, 1);
      table.add(forwards.get(column - 1), column, 2);
      column++;
    }
    chain(backs, forwards);
  }

  private void head(String text, int line) {
    Label head = new Label(text);
    head.getStyleClass().add(Looks.TIGHT);
    head.setMinWidth(Region.USE_PREF_SIZE);
    table.add(head, 0, line);
  }

  private CheckCell cell(RoomRow row, boolean back, boolean editable) {
    String number = Integer.toString(row.string());
    String name =
        back ? texts.say("visit.room.back-of", number) : texts.say("visit.room.forward-of", number);
    CheckCell cell = new CheckCell(back ? row.back() : row.forward(), name, () -> save.accept(row));
    cell.setId((back ? "room-back-" : "room-forward-") + number);
    cell.getStyleClass().add("room-cell");
    cell.setEditable(editable);
    cell.focusedProperty().addListener((property, before, now) -> say(cell));
    cell.textProperty().addListener((property, before, now) -> say(cell));
    return cell;
  }

  private void say(CheckCell cell) {
    String words = cell.said(texts);
    said.getStyleClass().setAll("label", cell.doubtful() ? Looks.ERROR_HEAD : Looks.NOTE);
    said.setText(words.isEmpty() ? "" : texts.say("visit.checks.said", cell.getText(), words));
    said.setManaged(!said.getText().isEmpty());
  }

  /** Enter goes along the strings, then to the other direction. */
  private static void chain(List<CheckCell> backs, List<CheckCell> forwards) {
    List<CheckCell> all = new ArrayList<>(backs);
    all.addAll(forwards);
    for (int i = 0; i + 1 < all.size(); i++) {
      all.get(i).then(all.get(i + 1)::requestFocus);
    }
  }
}
