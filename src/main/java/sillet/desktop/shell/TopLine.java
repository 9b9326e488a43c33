package sillet.desktop.shell;

import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import sillet.desktop.drawing.Mark;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** Places, search, what is saved, and who works. */
final class TopLine extends HBox {
  private final Texts texts;
  private final Button bench;
  private final Button instruments;
  private final Button shop;
  private final TextField search = new TextField();
  private final Mark mark;
  private final Label words = new Label();
  private final MenuButton technician = new MenuButton();

  TopLine(Texts texts) {
    this.texts = texts;
    bench = place("shell.bench", "bench-word");
    instruments = place("shell.instruments", "instruments-word");
    shop = place("shell.shop", "shop-word");
    HBox places = new HBox(bench, instruments, shop);
    places.getStyleClass().add("places");
    places.setMinWidth(Region.USE_PREF_SIZE);
    mark = Mark.small(MarkShape.SAVED, "");
    words.setId("save-words");
    HBox sign = new HBox(mark, words);
    sign.getStyleClass().add("save-sign");
    sign.setMinWidth(Region.USE_PREF_SIZE);
    technician.getStyleClass().add("technician");
    technician.setId("technician");
    getStyleClass().add("top-line");
    getChildren().addAll(places, stretch(), searchField(), stretch(), sign, technician);
  }

  void onBench(Runnable action) {
    bench.setOnAction(pressed -> action.run());
  }

  void onInstruments(Runnable action) {
    instruments.setOnAction(pressed -> action.run());
  }

  void onShop(Runnable action) {
    shop.setOnAction(pressed -> action.run());
  }

  TextField search() {
    return search;
  }

  /** Underlines the place one is at. */
  void here(Place place) {
    Place.Word word = place.word();
    bench.pseudoClassStateChanged(Looks.CURRENT, word == Place.Word.BENCH);
    instruments.pseudoClassStateChanged(Looks.CURRENT, word == Place.Word.INSTRUMENTS);
    shop.pseudoClassStateChanged(Looks.CURRENT, word == Place.Word.SHOP);
  }

  /** Says what is saved. */
  void say(SaveSignModel.Sign sign) {
    String said = texts.say(sign.words());
    boolean nothing = sign.shape() == SaveSignModel.Shape.NOTHING;
    words.setText(nothing ? "" : said);
    words.getStyleClass().setAll("label");
    if (sign.shape() == SaveSignModel.Shape.CROSSED) {
      words.getStyleClass().add(Looks.NEEDS_HAND);
    }
    mark.setVisible(!nothing);
    mark.show(
        switch (sign.shape()) {
          case NOTHING, FULL -> MarkShape.SAVED;
          case HALF -> MarkShape.DRAFT;
          case CROSSED -> MarkShape.NOT_SAVED;
        },
        said);
  }

  /** Shows who works and lets another take over. */
  void technicians(List<String> names, BenchNow bench) {
    technician.textProperty().bind(bench.technicianProperty());
    technician.setAccessibleText(texts.say("shell.technician"));
    technician.setVisible(!names.isEmpty());
    technician.getItems().clear();
    for (String name : names) {
      MenuItem item = new MenuItem(name);
      item.setMnemonicParsing(false);
      item.setOnAction(chosen -> bench.technicianProperty().set(name));
      technician.getItems().add(item);
    }
  }

  private StackPane searchField() {
    search.setId("search");
    search.setPromptText(texts.say("shell.search"));
    search.setAccessibleText(texts.say("shell.search"));
    Label key = new Label(texts.say("shell.search-key"));
    key.getStyleClass().add(Looks.KEY_HINT);
    key.setMouseTransparent(true);
    StackPane field = new StackPane(search, key);
    field.getStyleClass().add("search-field");
    return field;
  }

  private Button place(String key, String id) {
    Button word = new Button(texts.say(key));
    word.setId(id);
    word.getStyleClass().add(Looks.PLACE_WORD);
    return word;
  }

  private static Region stretch() {
    Region region = new Region();
    setHgrow(region, Priority.ALWAYS);
    return region;
  }
}
