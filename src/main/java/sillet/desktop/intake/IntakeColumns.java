package sillet.desktop.intake;

import java.util.List;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import sillet.desktop.controls.Narrow;

/** The panels side by side, or one under the other in a narrow window. */
final class IntakeColumns extends GridPane {
  private final List<Region> panels;
  private final Narrow narrow;

  IntakeColumns(List<Region> panels) {
    this.panels = List.copyOf(panels);
    this.narrow = new Narrow(this);
    getStyleClass().add("panels");
    narrow.narrowProperty().addListener((property, before, now) -> arrange(now));
    arrange(false);
  }

  private void arrange(boolean inOneColumn) {
    getChildren().setAll(narrow.measure());
    getColumnConstraints().clear();
    int columns = inOneColumn ? 1 : panels.size();
    for (int i = 0; i < panels.size(); i++) {
      Region panel = panels.get(i);
      panel.setMaxWidth(Double.MAX_VALUE);
      panel.setMaxHeight(Double.MAX_VALUE);
      if (inOneColumn) {
        add(panel, 0, i);
      } else {
        add(panel, i, 0);
      }
      setHgrow(panel, Priority.ALWAYS);
      setVgrow(panel, Priority.ALWAYS);
    }
    for (int i = 0; i < columns; i++) {
      ColumnConstraints share = new ColumnConstraints();
      share.setPercentWidth(100.0 / columns);
      getColumnConstraints().add(share);
    }
  }
}
