package sillet.desktop.visit;

import java.util.List;
import javafx.scene.Node;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.RowConstraints;
import javafx.scene.layout.VBox;
import sillet.desktop.drawing.strings.SheetShape;
import sillet.desktop.theme.Looks;

/** Puts the panels of the page where the shape of the window wants them. */
final class VisitPage extends VBox {
  private static final double WIDE_COLUMN_EM = 24;

  private final Node head;
  private final Node sections;
  private final Region readings;
  private final List<Region> below;
  private final List<Region> lower;

  /**
   * A page.
   *
   * @param head the ticket
   * @param sections the line of words
   * @param readings the drawing
   * @param below checks, findings, work
   * @param lower room at the saddles, notes
   */
  VisitPage(Node head, Node sections, Region readings, List<Region> below, List<Region> lower) {
    this.head = head;
    this.sections = sections;
    this.readings = readings;
    this.below = below;
    this.lower = lower;
    getStyleClass().addAll(Looks.PAGE, "visit-page");
  }

  /** Takes a shape. */
  void setShape(SheetShape shape, double em) {
    clear();
    getStyleClass().remove("narrow-page");
    if (shape == SheetShape.NARROW) {
      getStyleClass().add("narrow-page");
    }
    switch (shape) {
      case NARROW -> narrow();
      case USUAL -> usual();
      case WIDE -> wide(em);
    }
  }

  private void clear() {
    getChildren().clear();
    for (Region panel : below) {
      panel.setMinWidth(0);
      panel.setPrefWidth(USE_COMPUTED_SIZE);
      panel.setMaxWidth(Double.MAX_VALUE);
    }
    for (Region panel : lower) {
      panel.setMinWidth(0);
      panel.setPrefWidth(USE_COMPUTED_SIZE);
    }
  }

  private void narrow() {
    getChildren().addAll(head, sections, readings);
    getChildren().addAll(below);
    getChildren().addAll(lower);
  }

  private void usual() {
    getChildren().addAll(head, sections, readings);
    getChildren().add(row(below, 44, 32, 24));
    getChildren().add(row(lower, 50, 50));
  }

  private void wide(double em) {
    GridPane beside = row(lower, 50, 50);
    VBox left = new VBox(readings, beside);
    VBox right = new VBox();
    right.getChildren().addAll(below);
    VBox.setVgrow(below.get(below.size() - 1), Priority.ALWAYS);
    VBox.setVgrow(beside, Priority.ALWAYS);
    left.getStyleClass().add("panels");
    right.getStyleClass().add("panels");
    right.setMinWidth(WIDE_COLUMN_EM * em);
    right.setPrefWidth(WIDE_COLUMN_EM * em);
    left.setMinWidth(0);
    HBox.setHgrow(left, Priority.ALWAYS);
    HBox columns = new HBox(left, right);
    columns.getStyleClass().add("panels");
    getChildren().addAll(head, sections, columns);
  }

  /** A row of panels that share its width in the given parts of a hundred. */
  private static GridPane row(List<Region> panels, double... parts) {
    GridPane row = new GridPane();
    row.getStyleClass().add("panels");
    for (int i = 0; i < panels.size(); i++) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(parts[i]);
      row.getColumnConstraints().add(column);
      row.add(panels.get(i), i, 0);
    }
    RowConstraints all = new RowConstraints();
    all.setVgrow(Priority.ALWAYS);
    row.getRowConstraints().add(all);
    return row;
  }
}
