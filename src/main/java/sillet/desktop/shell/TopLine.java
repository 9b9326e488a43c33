package sillet.desktop.shell;

import java.util.List;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Narrow;
import sillet.desktop.drawing.Mark;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** Places, search, what is saved, and who works. */
final class TopLine extends VBox {
  private final Texts texts;
  private final Button bench;
  private final Button instruments;
  private final Button sets;
  private final Button shop;
  private final TextField search = new TextField();
  private final HBox places;
  private final StackPane field;
  private final HBox sign;
  private final Mark mark;
  private final Label words = new Label();
  private final MenuButton technician = new MenuButton();

  TopLine(Texts texts) {
    this.texts = texts;
    bench = place("shell.bench", "bench-word");
    instruments = place("shell.instruments", "instruments-word");
    sets = place("shell.sets", "sets-word");
    shop = place("shell.shop", "shop-word");
    this.places = new HBox(bench, instruments, sets, shop);
    places.getStyleClass().add("places");
    places.setMinWidth(Region.USE_PREF_SIZE);
    mark = Mark.small(MarkShape.SAVED, "");
    words.setId("save-words");
    this.sign = new HBox(mark, words);
    sign.getStyleClass().add("save-sign");
    sign.setMinWidth(Region.USE_PREF_SIZE);
    technician.getStyleClass().add("technician");
    technician.setId("technician");
    this.field = searchField();
    getStyleClass().add("top-line");
    Narrow narrow = new Narrow(this);
    narrow.tightProperty().addListener((property, before, now) -> layOut(now, narrow));
    layOut(false, narrow);
  }

  /** One line, or two where the window is too tight for one. */
  private void layOut(boolean tight, Narrow narrow) {
    getChildren().clear();
    if (tight) {
      HBox.setHgrow(field, Priority.ALWAYS);
      getChildren().addAll(line(places, stretch(), sign), line(field, technician));
    } else {
      HBox.setHgrow(field, Priority.NEVER);
      getChildren().add(line(places, stretch(), field, stretch(), sign, technician));
    }
    getChildren().add(narrow.measure());
  }

  private static HBox line(Node... parts) {
    HBox line = new HBox(parts);
    line.getStyleClass().add("top-words");
    return line;
  }

  void onBench(Runnable action) {
    bench.setOnAction(pressed -> action.run());
  }

  void onInstruments(Runnable action) {
    instruments.setOnAction(pressed -> action.run());
  }

  void onSets(Runnable action) {
    sets.setOnAction(pressed -> action.run());
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
    sets.pseudoClassStateChanged(Looks.CURRENT, word == Place.Word.SETS);
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
    StackPane both = new StackPane(search, key);
    both.getStyleClass().add("search-field");
    return both;
  }

  private Button place(String key, String id) {
    Button word = new Button(texts.say(key));
    word.setId(id);
    word.getStyleClass().add(Looks.PLACE_WORD);
    return word;
  }

  private static Region stretch() {
    Region region = new Region();
    HBox.setHgrow(region, Priority.ALWAYS);
    return region;
  }
}
