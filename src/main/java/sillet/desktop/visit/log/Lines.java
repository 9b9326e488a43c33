package sillet.desktop.visit.log;

import java.util.List;
import javafx.geometry.VPos;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import sillet.desktop.theme.Looks;

/** Lines with their times in a column. */
final class Lines extends GridPane {
  Lines() {
    getStyleClass().add("written-lines");
    ColumnConstraints times = new ColumnConstraints();
    ColumnConstraints words = new ColumnConstraints();
    words.setHgrow(Priority.ALWAYS);
    getColumnConstraints().addAll(times, words);
  }

  void show(List<WrittenLine> lines) {
    getChildren().clear();
    for (int i = 0; i < lines.size(); i++) {
      WrittenLine line = lines.get(i);
      Label time = new Label(line.time());
      time.getStyleClass().add(Looks.SOFT);
      time.setMinWidth(Region.USE_PREF_SIZE);
      String kind = line.kind().isEmpty() ? "" : line.kind() + ": ";
      Label words = new Label(kind + line.text());
      words.setWrapText(true);
      words.setMinHeight(Region.USE_PREF_SIZE);
      setValignment(time, VPos.TOP);
      add(time, 0, i);
      add(words, 1, i);
    }
  }
}
