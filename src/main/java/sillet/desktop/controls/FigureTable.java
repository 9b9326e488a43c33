package sillet.desktop.controls;

import javafx.geometry.HPos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import sillet.desktop.theme.Looks;

/** A table of words and figures, a rule under each row. */
public final class FigureTable extends GridPane {
  private int rows;

  /** How a column stands. */
  public enum Column {
    /** Words, as wide as they are. */
    WORDS,
    /** Words that wrap and take the room there is. */
    SENTENCE,
    /** A figure, by its right edge. */
    FIGURE
  }

  public FigureTable(Column... columns) {
    getStyleClass().add("rule-table");
    for (Column kind : columns) {
      ColumnConstraints column = new ColumnConstraints();
      column.setHalignment(kind == Column.FIGURE ? HPos.RIGHT : HPos.LEFT);
      if (kind == Column.SENTENCE) {
        column.setHgrow(Priority.ALWAYS);
        column.setMinWidth(0);
      } else {
        column.setMinWidth(Region.USE_PREF_SIZE);
      }
      getColumnConstraints().add(column);
    }
  }

  /** The heads of the columns, in small type. */
  public void head(String... heads) {
    for (int column = 0; column < heads.length; column++) {
      Label head = new Label(heads[column]);
      head.getStyleClass().add(Looks.NOTE);
      add(head, column, rows);
    }
    rule();
  }

  /** A row; a text stands for a label, a node for itself. */
  public void row(Object... cells) {
    for (int column = 0; column < cells.length; column++) {
      add(node(cells[column]), column, rows);
    }
    rule();
  }

  private static Node node(Object cell) {
    if (cell instanceof Node node) {
      return node;
    }
    Label label = new Label(cell.toString());
    label.setWrapText(true);
    label.setMinHeight(Region.USE_PREF_SIZE);
    return label;
  }

  /** A figure to act on. */
  public static Label strong(String text) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.STRONG);
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  /** A second figure. */
  public static Label soft(String text) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.SOFT);
    label.setWrapText(true);
    return label;
  }

  private void rule() {
    Region rule = new Region();
    rule.getStyleClass().add("table-rule");
    add(rule, 0, rows + 1, getColumnConstraints().size(), 1);
    rows += 2;
  }
}
