package sillet.desktop.visit;

import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.words.NeckNotes;
import sillet.logbook.text.Texts;

/** The cents of the string in hand: over the neck in one line, and with the whole neck by fret. */
final class NeckTable extends VBox {
  private final Texts texts;
  private final GridPane table = new GridPane();
  private final Label head = new Label();
  private final Label sum = new Label();
  private final Label brackets = new Label();
  private @Nullable NeckNotes shown;

  NeckTable(Texts texts) {
    this.texts = texts;
    head.getStyleClass().add(Looks.STRONG);
    head.setMinWidth(Region.USE_PREF_SIZE);
    sum.setMinWidth(Region.USE_PREF_SIZE);
    brackets.setText(texts.say("visit.neck.brackets"));
    brackets.getStyleClass().add(Looks.NOTE);
    brackets.setMinWidth(0);
    Label keys = new Label(texts.say("visit.grid.keys"));
    keys.getStyleClass().add(Looks.NOTE);
    keys.setMinWidth(0);
    Region apart = new Region();
    HBox.setHgrow(apart, Priority.ALWAYS);
    HBox line = new HBox(head, sum, apart, keys);
    line.getStyleClass().add("panel-line");
    table.getStyleClass().add("neck-table");
    table.setMinWidth(0);
    setMinWidth(0);
    getStyleClass().add("neck");
    getChildren().addAll(line, table);
  }

  /** Shows a string. */
  void show(NeckNotes wanted, boolean wholeNeck) {
    boolean byFret = wholeNeck && !wanted.notes().isEmpty();
    table.setVisible(byFret);
    table.setManaged(byFret);
    if (wanted.equals(shown)) {
      return;
    }
    shown = wanted;
    head.setText(wanted.head());
    sum.setText(wanted.sum());
    table.getChildren().clear();
    name(texts.say("visit.neck.fret"), 0);
    name(texts.say("visit.neck.now"), 1);
    name(texts.say("visit.neck.after"), 2);
    table.add(brackets, 1, 3, GridPane.REMAINING, 1);
    int column = 1;
    for (NeckNotes.Note note : wanted.notes()) {
      figure(note.fret(), note.read() ? Looks.STRONG : Looks.SOFT, column, 0);
      figure(note.now(), note.read() ? "" : Looks.SOFT, column, 1);
      figure(note.after(), note.read() ? "" : Looks.SOFT, column, 2);
      column++;
    }
  }

  private void name(String text, int line) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.SOFT);
    label.setMinWidth(Region.USE_PREF_SIZE);
    table.add(label, 0, line);
  }

  private void figure(String text, String look, int column, int line) {
    Label label = new Label(text);
    label.getStyleClass().add("neck-figure");
    if (!look.isEmpty()) {
      label.getStyleClass().add(look);
    }
    label.setMinWidth(Region.USE_PREF_SIZE);
    table.add(label, column, line);
  }
}
