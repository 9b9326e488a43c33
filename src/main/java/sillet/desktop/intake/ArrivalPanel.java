package sillet.desktop.intake;

import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** What is asked for, until when, in what air. */
final class ArrivalPanel extends VBox {
  private static final int ROWS = 3;

  ArrivalPanel(ArrivalModel model, Texts texts) {
    Label head = new Label(texts.say("intake.arrival"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    FormGrid form = new FormGrid(texts);
    TextArea request = new TextArea();
    request.setWrapText(true);
    request.setPrefRowCount(ROWS);
    request.addEventFilter(KeyEvent.KEY_PRESSED, key -> leave(request, key));
    form.sentences(model.request(), texts.say("intake.arrival.request"), "request", request);
    form.figure(model.promised(), texts.say("intake.arrival.promised"), "promised")
        .setPromptText(texts.say("intake.arrival.promised-prompt"));
    form.words(model.condition(), texts.say("intake.arrival.condition"), "condition");
    form.figure(model.temperature(), texts.say("intake.arrival.temperature"), "temperature");
    form.figure(model.humidity(), texts.say("intake.arrival.humidity"), "humidity");
    getStyleClass().addAll(Looks.PANEL, "intake-panel");
    getChildren().addAll(head, form);
  }

  /** Tab leaves the words as it leaves every other field. */
  private static void leave(TextArea area, KeyEvent key) {
    if (key.getCode() == KeyCode.TAB && !key.isControlDown()) {
      KeyEvent away =
          new KeyEvent(
              key.getEventType(),
              key.getCharacter(),
              key.getText(),
              key.getCode(),
              key.isShiftDown(),
              true,
              key.isAltDown(),
              key.isMetaDown());
      key.consume();
      area.fireEvent(away);
    }
  }
}
