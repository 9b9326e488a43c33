package sillet.desktop.visit.made;

import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/** One saddle's row while the moves made are typed: how much, and which way in words. */
final class MadeRowView extends HBox {
  private final MadeRow row;
  private final Texts texts;
  private final Runnable changed;
  private final TextField size = new TextField();
  private final Button way = new Button();
  private final Label said = new Label();

  MadeRowView(MadeRow row, Texts texts, Runnable changed) {
    this.row = row;
    this.texts = texts;
    this.changed = changed;
    String number = Integer.toString(row.string());
    size.setId("made-" + number);
    size.setAccessibleText(texts.say("visit.made.size", number));
    size.setText(row.text());
    size.getStyleClass().add("made-size");
    way.setId("made-way-" + number);
    way.getStyleClass().add("made-way");
    way.setOnAction(pressed -> turnAround());
    said.setMinWidth(USE_PREF_SIZE);
    getStyleClass().add("made-row");
    setAlignment(Pos.CENTER_LEFT);
    getChildren().addAll(size, said, way);
    listen();
    show();
  }

  TextField size() {
    return size;
  }

  private void listen() {
    size.textProperty()
        .addListener(
            (property, before, now) -> {
              row.type(now);
              show();
              changed.run();
            });
    size.addEventFilter(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.UP || event.getCode() == KeyCode.DOWN) {
            row.step(event.getCode() == KeyCode.UP ? 1 : -1);
            size.setText(row.text());
            size.end();
            event.consume();
          }
        });
    size.focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (now) {
                size.selectAll();
              }
            });
  }

  private void turnAround() {
    row.turnAround();
    show();
    changed.run();
  }

  private void show() {
    way.setText(texts.say(row.away() ? "direction.away" : "direction.toward"));
    Message problem = row.problem();
    size.pseudoClassStateChanged(Looks.ERROR, problem != null);
    size.setAccessibleHelp(problem == null ? "" : texts.say(problem));
    said.getStyleClass()
        .setAll("label", "made-said", problem == null ? Looks.NOTE : Looks.ERROR_HEAD);
    if (problem != null) {
      said.setText(texts.say("visit.made.wrong"));
    } else if (row.text().isBlank()) {
      said.setText(texts.say("visit.made.not"));
    } else {
      said.setText(texts.say(row.screwMm() == null ? "visit.words.mm" : "visit.words.turns"));
    }
  }
}
