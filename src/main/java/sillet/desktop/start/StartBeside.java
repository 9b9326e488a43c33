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

  private StartBeside(Texts texts) {
    this.texts = texts;
    getStyleClass().add("start-beside");
  }

  /** Beside a first start. */
  static StartBeside first(Texts texts, Runnable demo, Runnable open, StartModel model) {
    StartBeside beside = new StartBeside(texts);
    beside
        .getChildren()
        .addAll(
            beside.trouble(model),
            with(beside.block("start.what", "start.what-said"), beside.board()),
            beside.demo("start.demo-head", demo),
            beside.other("start.other-head", open),
            beside.keys());
    return beside;
  }

  /** Beside a shop that has its logbook. */
  static StartBeside later(Texts texts, Runnable demo, Runnable open) {
    StartBeside beside = new StartBeside(texts);
    beside
        .getChildren()
        .addAll(
            beside.demo("start.demo-later", demo),
            beside.other("start.other-later", open),
            beside.keys());
    return beside;
  }

  private VBox demo(String head, Runnable action) {
    Button openDemo =
        KeyHint.button(texts.say("start.demo-open"), texts.say("start.demo-key"), action);
    openDemo.setId("open-demo");
    return with(block(head, "start.demo-said"), openDemo);
  }

  private VBox other(String head, Runnable action) {
    Button openOther =
        KeyHint.button(texts.say("start.other-open"), texts.say("start.other-key"), action);
    openOther.setId("open-other");
    return with(block(head, "start.other-said"), openOther);
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
