package sillet.desktop.history;

import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Days;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.theme.Looks;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.shop.Customer;
import sillet.logbook.text.Texts;
import sillet.store.reading.InstrumentLine;

/** The instrument and whose it is, with what can be done from here. */
final class HistoryHead extends HBox {
  private final Texts texts;
  private final HistoryWords words;
  private final ObservableBooleanValue narrow;
  private final Label name = new Label();
  private final Label facts = new Label();
  private final Label customer = new Label();
  private final Label visits = new Label();
  private String fixed = "";

  /**
   * A head without an instrument yet.
   *
   * @param texts the words
   * @param words the sentences of a history
   * @param narrow whether customer and facts share a line
   * @param buttons what can be done from here
   */
  HistoryHead(Texts texts, HistoryWords words, ObservableBooleanValue narrow, Button... buttons) {
    this.texts = texts;
    this.words = words;
    this.narrow = narrow;
    name.setId("history-name");
    name.getStyleClass().add(Looks.PAGE_NAME);
    name.setWrapText(true);
    facts.getStyleClass().add(Looks.NOTE);
    facts.setWrapText(true);
    customer.setWrapText(true);
    visits.setWrapText(true);
    customer.getStyleClass().add(Looks.STRONG);
    visits.getStyleClass().add(Looks.NOTE);
    VBox what = new VBox(name, facts);
    VBox whose = new VBox(customer, visits);
    what.getStyleClass().add("head-lines");
    whose.getStyleClass().addAll("head-lines", "head-whose");
    what.setMinWidth(0);
    whose.setMinWidth(0);
    HBox.setHgrow(what, Priority.ALWAYS);
    getStyleClass().addAll(Looks.PANEL, "history-head");
    what.setPrefWidth(0);
    whose.managedProperty().bind(whose.visibleProperty());
    whose.visibleProperty().bind(Bindings.not(narrow));
    narrow.addListener((property, before, now) -> under());
    setMinHeight(Region.USE_PREF_SIZE);
    getChildren().addAll(what, whose, KeyHint.line(buttons));
  }

  void show(InstrumentLine line) {
    Instrument instrument = line.instrument().what();
    Customer owner = line.customer();
    name.setText(instrument.name());
    customer.setText(owner == null ? texts.say("history.nobody") : owner.name());
    String phone = owner == null ? "" : owner.phone();
    String count =
        line.visits() == 1
            ? texts.say("history.one-visit")
            : texts.say("history.visits", Integer.toString(line.visits()));
    String last =
        line.lastTakenIn() == null
            ? count
            : texts.say("history.visits-last", count, Days.full(line.lastTakenIn()));
    visits.setText(phone.isBlank() ? last : phone + " · " + last);
    fixed = words.facts(instrument);
    under();
  }

  /** The line under the name: what it is, and where there is no room beside it, whose. */
  private void under() {
    facts.setText(
        narrow.get() ? customer.getText() + " · " + visits.getText() + " · " + fixed : fixed);
  }
}
