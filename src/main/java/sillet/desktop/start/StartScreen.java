package sillet.desktop.start;

import java.util.Map;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import sillet.desktop.controls.Ask;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** Three lines, then the bench; or a look at the demo; or a logbook that exists. */
public final class StartScreen implements Screen {
  private final StartModel model;
  private final Ways ways;
  private final Ask ask;
  private final Texts texts;
  private final ShopForm form;
  private final StartPage page;

  /**
   * A first start.
   *
   * @param model the three lines
   * @param ways where one can go from here
   * @param ask picks a file
   * @param texts the words
   * @param place where the new logbook will lie
   */
  public StartScreen(StartModel model, Ways ways, Ask ask, Texts texts, String place) {
    this.model = model;
    this.ways = ways;
    this.ask = ask;
    this.texts = texts;
    this.form = form();
    Label program = new Label(texts.say("start.program"));
    program.getStyleClass().add("start-name");
    this.page =
        new StartPage(
            program,
            texts.say("start.promise", place),
            form,
            StartBeside.first(texts, ways::demo, this::open, model));
    page.disableProperty().bind(model.busyProperty());
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    form.focus();
  }

  @Override
  public void left() {
    // nothing typed here outlives the screen: the shop is saved, or it is not begun
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(
        StartPage.key(KeyCode.ENTER), this::begin,
        StartPage.key(KeyCode.D), ways::demo,
        StartPage.key(KeyCode.O), this::open);
  }

  private void begin() {
    model.shop().ifPresent(ways::begin);
  }

  private void open() {
    ask.fileToOpen().ifPresent(ways::open);
  }

  private ShopForm form() {
    Button go = KeyHint.button(texts.say("start.begin"), texts.say("start.begin-key"), this::begin);
    go.setId("begin");
    go.getStyleClass().add(Looks.PRIMARY);
    Label wait = new Label(texts.say("start.can-wait"));
    wait.getStyleClass().add(Looks.SOFT);
    return new ShopForm(model, texts, go, wait);
  }
}
