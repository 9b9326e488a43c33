package sillet.desktop.shell;

import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** Every key of the window on one sheet. */
final class KeySheet {
  private final Dialogs dialogs;
  private final Texts texts;

  KeySheet(Dialogs dialogs, Texts texts) {
    this.dialogs = dialogs;
    this.texts = texts;
  }

  /** Shows the sheet and waits until it is put away. */
  void show() {
    ButtonType read = new ButtonType(texts.say("shell.go-on"), ButtonData.OK_DONE);
    dialogs.show(texts.say("shell.keys"), dialogs.sheet(grid()), read);
  }

  private GridPane grid() {
    GridPane grid = new GridPane();
    grid.getStyleClass().add("key-grid");
    row(grid, "shell.key-f1", "shell.key-f1-does");
    row(grid, "shell.key-places", "shell.key-places-does");
    row(grid, "shell.key-search", "shell.key-search-does");
    row(grid, "shell.key-new", "shell.key-new-does");
    row(grid, "shell.key-enter", "shell.key-enter-does");
    row(grid, "shell.key-back", "shell.key-back-does");
    row(grid, "shell.key-theme", "shell.key-theme-does");
    row(grid, "shell.key-text", "shell.key-text-does");
    row(grid, "shell.key-parts-sheets", "shell.key-parts-sheets-does");
    row(grid, "shell.key-sets", "shell.key-sets-does");
    row(grid, "shell.key-view", "shell.key-view-does");
    head(grid, "shell.keys-visit");
    row(grid, "shell.key-parts", "shell.key-parts-does");
    row(grid, "shell.key-neck", "shell.key-neck-does");
    row(grid, "shell.key-aim", "shell.key-aim-does");
    row(grid, "shell.key-moves", "shell.key-moves-does");
    row(grid, "shell.key-passes", "shell.key-passes-does");
    row(grid, "shell.key-turn", "shell.key-turn-does");
    row(grid, "shell.key-log", "shell.key-log-does");
    row(grid, "shell.key-forecast", "shell.key-forecast-does");
    row(grid, "shell.key-sheet", "shell.key-sheet-does");
    row(grid, "shell.key-hand-out", "shell.key-hand-out-does");
    return grid;
  }

  private void head(GridPane grid, String key) {
    Label head = new Label(texts.say(key));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    grid.add(head, 0, grid.getRowCount(), 2, 1);
  }

  private void row(GridPane grid, String key, String does) {
    Label keys = new Label(texts.say(key));
    keys.getStyleClass().add(Looks.STRONG);
    keys.setMinWidth(Region.USE_PREF_SIZE);
    Label what = new Label(texts.say(does));
    what.setWrapText(true);
    int row = grid.getRowCount();
    grid.add(keys, 0, row);
    grid.add(what, 1, row);
  }
}
