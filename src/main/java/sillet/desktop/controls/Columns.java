package sillet.desktop.controls;

import java.util.List;
import javafx.beans.value.ObservableBooleanValue;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.RowConstraints;

/** Lays parts side by side by shares of the width; one under the other where the page is narrow. */
public final class Columns extends GridPane {
  private final ObservableBooleanValue narrow;
  private final double[] shares;
  private List<Node> parts = List.of();

  /**
   * Columns with nothing in them.
   *
   * @param narrow whether they stand one under the other
   * @param shares percent of the width for each part
   */
  public Columns(ObservableBooleanValue narrow, double... shares) {
    this.narrow = narrow;
    this.shares = shares.clone();
    narrow.addListener((property, before, now) -> layOut());
  }

  /** Shows these parts, at most as many as there are shares. */
  public void show(Node... nodes) {
    parts = List.of(nodes);
    layOut();
  }

  private void layOut() {
    getChildren().clear();
    getColumnConstraints().clear();
    getRowConstraints().clear();
    boolean under = narrow.get();
    for (int i = 0; i < parts.size(); i++) {
      add(parts.get(i), under ? 0 : i, under ? i : 0);
      if (!under) {
        getColumnConstraints().add(column(shares[i]));
      }
    }
    if (under) {
      getColumnConstraints().add(column(100));
    } else {
      RowConstraints row = new RowConstraints();
      row.setVgrow(Priority.ALWAYS);
      row.setValignment(VPos.TOP);
      getRowConstraints().add(row);
    }
  }

  private static ColumnConstraints column(double share) {
    ColumnConstraints column = new ColumnConstraints();
    column.setPercentWidth(share);
    column.setFillWidth(true);
    return column;
  }
}
