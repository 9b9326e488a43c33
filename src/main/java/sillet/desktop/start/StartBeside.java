package sillet.desktop.start;

import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/**
 * Beside the three lines: what the program is for, the demo, a logbook that exists, and trouble.
 */
final class StartBeside extends VBox {
  private final Texts texts;

  StartBeside(Texts texts, Runnable demo, Runnable open, StartModel model) {
    this.texts = texts;
    getStyleClass().add("start-beside");
    Button openDemo =
        KeyHint.button(texts.say("start.demo-open"), texts.say("start.demo-key"), demo);
    openDemo.setId("open-demo");
    Button openOther =
        KeyHint.button(texts.say("start.other-open"), texts.say("start.other-key"), open);
    openOther.setId("open-other");
    VBox last = block("start.other-head", "start.other-said");
    last.getStyleClass().add("last-block");
    getChildren()
        .addAll(
            trouble(model),
            with(block("start.what", "start.what-said"), board()),
            with(block("start.demo-head", "start.demo-said"), openDemo),
            with(last, openOther),
            keys());
  }

  private VBox trouble(StartModel model) {
    Label said = new Label();
    said.setId("start-trouble");
    said.setWrapText(true);
    said.getStyleClass().add(Looks.NEEDS_HAND);
    VBox block = new VBox(said);
    block.managedProperty().bind(said.visibleProperty());
    model.troubleProperty().addListener((property, before, now) -> say(said, now));
    say(said, model.troubleProperty().get());
    return block;
  }

  private void say(Label said, Optional<Message> trouble) {
    said.setVisible(trouble.isPresent());
    said.setText(trouble.map(texts::say).orElse(""));
  }

  private VBox block(String headKey, String saidKey) {
    Label head = new Label(texts.say(headKey));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    head.setWrapText(true);
    Label said = new Label(texts.say(saidKey));
    said.getStyleClass().add(Looks.SENTENCE);
    said.setWrapText(true);
    VBox block = new VBox(head, said);
    block.getStyleClass().add("start-block");
    return block;
  }

  private Label keys() {
    Label keys = new Label(texts.say("start.keys"));
    keys.getStyleClass().add(Looks.SOFT);
    return keys;
  }

  private EmptyBoard board() {
    return new EmptyBoard(texts.say("start.nut"), texts.say("start.bridge"));
  }

  private static VBox with(VBox block, Region part) {
    block.getChildren().add(part);
    return block;
  }
}
