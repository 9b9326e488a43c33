package sillet.desktop.start;

import java.util.Map;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Ask;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/**
 * A logbook that is there but cannot be opened: says why, and the ways out. It is never replaced by
 * an empty one.
 */
public final class TroubleScreen implements Screen {
  private final Ways ways;
  private final Ask ask;
  private final Button again;
  private final StackPane page;

  /**
   * What stands in the way.
   *
   * @param what the sentence of the problem
   * @param advice what helps
   * @param ways where one can go from here
   * @param ask picks a file
   * @param texts the words
   */
  public TroubleScreen(Message what, Message advice, Ways ways, Ask ask, Texts texts) {
    this.ways = ways;
    this.ask = ask;
    Label head = new Label(texts.say("start.trouble"));
    head.getStyleClass().add(Looks.PAGE_NAME);
    Label said = new Label(texts.say(what));
    said.setId("trouble");
    said.getStyleClass().add(Looks.NEEDS_HAND);
    said.setWrapText(true);
    Label helps = new Label(texts.say(advice));
    helps.getStyleClass().add(Looks.SENTENCE);
    helps.setWrapText(true);
    this.again = new Button(texts.say("start.again"));
    again.setOnAction(pressed -> ways.again());
    again.getStyleClass().add(Looks.PRIMARY);
    again.setId("again");
    Button other =
        KeyHint.button(texts.say("start.other-open"), texts.say("start.other-key"), this::open);
    Button demo =
        KeyHint.button(texts.say("start.demo-open"), texts.say("start.demo-key"), ways::demo);
    HBox outs = new HBox(again, other, demo);
    outs.getStyleClass().add("choice-line");
    VBox panel = new VBox(head, said, helps, outs);
    panel.getStyleClass().addAll(Looks.PANEL, "trouble-panel");
    this.page = new StackPane(panel);
    page.getStyleClass().add("trouble-page");
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    again.requestFocus();
  }

  @Override
  public void left() {
    // nothing is typed here
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(
        new KeyCodeCombination(KeyCode.D, KeyCombination.SHORTCUT_DOWN), ways::demo,
        new KeyCodeCombination(KeyCode.O, KeyCombination.SHORTCUT_DOWN), this::open);
  }

  private void open() {
    ask.fileToOpen().ifPresent(ways::open);
  }
}
