package sillet.desktop.visit;

import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.words.BridgeLine;
import sillet.logbook.text.Texts;

/** What a saddle or bridge in one piece can do for all strings together. */
final class BridgePanel extends VBox {
  private final Texts texts;
  private @Nullable BridgeLine shown;

  BridgePanel(Texts texts) {
    this.texts = texts;
    getStyleClass().addAll(Looks.PANEL, "room");
    setVisible(false);
    setManaged(false);
  }

  /** Shows it; nothing where every string has a saddle of its own. */
  void show(Optional<BridgeLine> wanted) {
    setVisible(wanted.isPresent());
    setManaged(wanted.isPresent());
    if (wanted.isPresent() && !wanted.get().equals(shown)) {
      shown = wanted.get();
      make(wanted.get());
    }
  }

  private void make(BridgeLine line) {
    Label head = new Label(line.head());
    head.getStyleClass().add(Looks.PANEL_HEAD);
    getChildren().setAll(head, sentence(line.ends(), Looks.STRONG), table(line));
    line.sentences().forEach(said -> getChildren().add(sentence(said, Looks.TIGHT)));
  }

  private GridPane table(BridgeLine line) {
    GridPane table = new GridPane();
    table.getStyleClass().add("room-table");
    boolean placed = line.columns().stream().anyMatch(column -> !column.fromFront().isEmpty());
    table.add(figure(texts.say("visit.room.string"), Looks.TIGHT), 0, 0);
    table.add(figure(texts.say("visit.bridge.stays"), Looks.TIGHT), 0, 1);
    if (placed) {
      table.add(figure(texts.say("visit.bridge.from-front"), Looks.TIGHT), 0, 2);
      table.add(figure(texts.say("visit.bridge.fits"), Looks.TIGHT), 0, 3);
    }
    int at = 1;
    for (BridgeLine.Column column : line.columns()) {
      table.add(figure(column.number(), Looks.STRONG), at, 0);
      table.add(figure(column.stays(), Looks.TIGHT), at, 1);
      if (placed) {
        table.add(figure(column.fromFront(), Looks.TIGHT), at, 2);
        table.add(figure(column.fits(), Looks.NOTE), at, 3);
      }
      at++;
    }
    return table;
  }

  private static Label figure(String text, String look) {
    Label label = new Label(text);
    label.getStyleClass().addAll(look, "room-number");
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  private static Label sentence(String text, String look) {
    Label label = new Label(text);
    label.getStyleClass().add(look);
    label.setWrapText(true);
    label.setMinHeight(Region.USE_PREF_SIZE);
    return label;
  }
}
