package sillet.desktop.bench;

import java.util.List;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import sillet.desktop.controls.Narrow;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** The columns of the bench; their widths stand in the style sheet, under these names. */
final class BenchColumns {
  private static final List<String> CLASSES =
      List.of(
          "col-ticket", "col-instrument", "col-customer", "col-asked", "col-strings", "col-next");
  private static final int INSTRUMENT = 1;
  private static final int CUSTOMER = 2;
  private static final int ASKED = 3;
  private static final int STRINGS = 4;

  private BenchColumns() {}

  /** Lays the parts of a row side by side; columns go where the page is narrow. */
  static HBox row(Narrow narrow, Region... parts) {
    HBox row = new HBox();
    for (int i = 0; i < parts.length; i++) {
      parts[i].getStyleClass().add(CLASSES.get(i));
      row.getChildren().add(parts[i]);
    }
    HBox.setHgrow(parts[ASKED], Priority.ALWAYS);
    HBox.setHgrow(parts[INSTRUMENT], Priority.SOMETIMES);
    hideWhen(parts[CUSTOMER], narrow.narrowProperty());
    hideWhen(parts[ASKED], narrow.tightProperty());
    hideWhen(parts[STRINGS], narrow.tightProperty());
    return row;
  }

  static HBox heads(Texts texts, Narrow narrow) {
    Label margin = new Label();
    margin.getStyleClass().add("bench-margin");
    HBox heads =
        row(
            narrow,
            head(texts.say("bench.col-ticket")),
            head(texts.say("bench.col-instrument")),
            head(texts.say("bench.col-customer")),
            head(texts.say("bench.col-asked")),
            head(texts.say("bench.col-strings")),
            head(texts.say("bench.col-next")));
    heads.getStyleClass().add("bench-row");
    HBox.setHgrow(heads, Priority.ALWAYS);
    HBox line = new HBox(margin, heads);
    line.getStyleClass().add("bench-heads");
    return line;
  }

  private static void hideWhen(Node node, ObservableBooleanValue when) {
    node.managedProperty().bind(node.visibleProperty());
    node.setVisible(!when.get());
    when.addListener((property, before, now) -> node.setVisible(!now));
  }

  /** In a box of its own, which has the column's width: the word's own em is smaller. */
  private static HBox head(String word) {
    Label label = new Label(word);
    label.getStyleClass().add(Looks.NOTE);
    return new HBox(label);
  }
}
