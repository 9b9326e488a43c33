package sillet.desktop.start;

import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Columns;
import sillet.desktop.controls.Narrow;
import sillet.desktop.theme.Looks;

/** A name and a sentence above the three lines, and what stands beside them. */
final class StartPage extends ScrollPane {
  StartPage(Label name, String sentence, ShopForm form, StartBeside beside) {
    VBox content = new VBox();
    Narrow narrow = new Narrow(content);
    Columns columns = new Columns(narrow.narrowProperty(), 65, 35);
    columns.getStyleClass().add("start-columns");
    columns.show(form, beside);
    content.getChildren().addAll(heading(name, sentence), columns, narrow.measure());
    content.getStyleClass().add("start-page");
    setContent(content);
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
  }

  private static HBox heading(Label name, String sentence) {
    name.setMinWidth(Region.USE_PREF_SIZE);
    Label said = new Label(sentence);
    said.getStyleClass().add(Looks.SOFT);
    said.setMinWidth(0);
    said.setWrapText(true);
    HBox line = new HBox(name, said);
    line.getStyleClass().add("start-heading");
    return line;
  }

  /** A key held together with the system's shortcut key. */
  static KeyCombination key(KeyCode code) {
    return new KeyCodeCombination(code, KeyCombination.SHORTCUT_DOWN);
  }
}
