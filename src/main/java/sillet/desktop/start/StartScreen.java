package sillet.desktop.start;

import java.util.Map;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Ask;
import sillet.desktop.controls.Columns;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Narrow;
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
  private final ScrollPane page;

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
    VBox content = new VBox();
    Narrow narrow = new Narrow(content);
    content.getChildren().addAll(heading(place), columns(narrow), narrow.measure());
    content.getStyleClass().add("start-page");
    this.page = new ScrollPane(content);
    page.setFitToWidth(true);
    page.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
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
        key(KeyCode.ENTER), this::begin,
        key(KeyCode.D), ways::demo,
        key(KeyCode.O), this::open);
  }

  private void begin() {
    model.shop().ifPresent(ways::begin);
  }

  private void open() {
    ask.fileToOpen().ifPresent(ways::open);
  }

  private static KeyCombination key(KeyCode code) {
    return new KeyCodeCombination(code, KeyCombination.SHORTCUT_DOWN);
  }

  private HBox heading(String place) {
    Label program = new Label(texts.say("start.program"));
    program.getStyleClass().add("start-name");
    Label promise = new Label(texts.say("start.promise", place));
    program.setMinWidth(Region.USE_PREF_SIZE);
    promise.getStyleClass().add(Looks.SOFT);
    promise.setMinWidth(0);
    promise.setWrapText(true);
    HBox line = new HBox(program, promise);
    line.getStyleClass().add("start-heading");
    return line;
  }

  private Columns columns(Narrow narrow) {
    Columns columns = new Columns(narrow.narrowProperty(), 65, 35);
    columns.show(form, StartBeside.first(texts, ways::demo, this::open, model));
    columns.getStyleClass().add("start-columns");
    return columns;
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
