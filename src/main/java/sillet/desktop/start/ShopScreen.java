package sillet.desktop.start;

import java.util.Map;
import java.util.function.Consumer;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.actions.NameShop;
import sillet.logbook.shop.Shop;

/** The shop as it is named, to be changed; and the ways to other logbooks. */
public final class ShopScreen implements Screen {
  private final Desk desk;
  private final Ways ways;
  private final Consumer<Shop> named;
  private final StartModel model;
  private final ShopForm form;
  private final StartPage page;

  /**
   * The shop of the logbook on a desk.
   *
   * @param desk what the screen is handed
   * @param ways to other logbooks
   * @param named takes the shop once it is saved
   */
  public ShopScreen(Desk desk, Ways ways, Consumer<Shop> named) {
    this.desk = desk;
    this.ways = ways;
    this.named = named;
    this.model = new StartModel(desk.atBench().shop());
    Button save = KeyHint.button(say("start.save"), say("start.save-key"), this::save);
    save.setId("save-shop");
    save.getStyleClass().add(Looks.PRIMARY);
    this.form = new ShopForm(model, desk.texts(), save);
    Label name = new Label(say("start.shop"));
    name.getStyleClass().add(Looks.PAGE_NAME);
    this.page =
        new StartPage(
            name,
            desk.texts().say("start.lies-at", desk.logbook().place()),
            form,
            StartBeside.later(desk.texts(), ways::demo, this::open));
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
    // the screen is kept, and what was typed in it
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(
        StartPage.key(KeyCode.S), this::save,
        StartPage.key(KeyCode.D), ways::demo,
        StartPage.key(KeyCode.O), this::open);
  }

  private void save() {
    model.shop().ifPresent(this::save);
  }

  private void save(Shop shop) {
    String technician = desk.atBench().technician();
    desk.background()
        .run(
            () -> desk.logbook().perform(new NameShop(shop), technician),
            saved -> {
              named.accept(shop);
              desk.sign().saved(saved.at());
            },
            desk.sign()::notSaved);
  }

  private void open() {
    desk.ask().fileToOpen().ifPresent(ways::open);
  }

  private String say(String key) {
    return desk.texts().say(key);
  }
}
