package sillet.desktop.instruments;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Days;
import sillet.desktop.theme.Looks;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.shop.Customer;
import sillet.logbook.text.Texts;
import sillet.store.reading.InstrumentLine;

/** An instrument in the list: what it is, whose, how often it was here. */
final class InstrumentCell extends ListCell<InstrumentLine> {
  private final Texts texts;
  private final ObservableBooleanValue narrow;
  private final Label name = new Label();
  private final Label facts = new Label();
  private final Label customer = new Label();
  private final Label phone = new Label();
  private final Label visits = new Label();
  private final Label last = new Label();
  private final HBox line;

  InstrumentCell(Texts texts, ObservableBooleanValue narrow) {
    this.texts = texts;
    this.narrow = narrow;
    name.getStyleClass().add(Looks.STRONG);
    for (Label second : List.of(facts, phone, last)) {
      second.getStyleClass().add(Looks.NOTE);
    }
    VBox what = new VBox(name, facts);
    VBox whose = new VBox(customer, phone);
    VBox when = new VBox(visits, last);
    what.getStyleClass().add("col-what");
    whose.getStyleClass().add("col-whose");
    when.getStyleClass().add("col-when");
    HBox.setHgrow(what, Priority.ALWAYS);
    this.line = new HBox(what, whose, when);
    line.getStyleClass().add("instrument-row");
    line.setMinWidth(0);
    setPrefWidth(0);
    hideWhenNarrow(whose);
    narrow.addListener((property, before, now) -> facts());
  }

  @Override
  protected void updateItem(@Nullable InstrumentLine item, boolean empty) {
    super.updateItem(item, empty);
    if (empty || item == null) {
      setGraphic(null);
      return;
    }
    Instrument instrument = item.instrument().what();
    Customer owner = item.customer();
    name.setText(instrument.name());
    customer.setText(owner == null ? texts.say("instruments.nobody") : owner.name());
    phone.setText(owner == null ? "" : owner.phone());
    facts();
    when(item);
    setGraphic(line);
    setAccessibleText(
        String.join(", ", name.getText(), facts.getText(), customer.getText(), visits.getText()));
  }

  private void when(InstrumentLine item) {
    Integer open = item.openTicket();
    visits.getStyleClass().setAll("label", open == null ? Looks.TIGHT : Looks.STRONG);
    String often =
        item.visits() == 1
            ? texts.say("instruments.one-visit")
            : texts.say("instruments.visits", Integer.toString(item.visits()));
    visits.setText(
        open == null ? often : texts.say("instruments.on-bench", Integer.toString(open)));
    String day = item.lastTakenIn() == null ? "" : Days.full(item.lastTakenIn());
    last.setText(day.isEmpty() ? "" : texts.say("instruments.last", day));
  }

  private void facts() {
    InstrumentLine item = getItem();
    if (item == null) {
      return;
    }
    Instrument instrument = item.instrument().what();
    List<String> parts = new ArrayList<>();
    if (narrow.get() && item.customer() != null) {
      parts.add(item.customer().name());
    }
    parts.add(texts.say(instrument.kind().key()));
    parts.add(texts.say("instruments.strings", Integer.toString(instrument.neck().strings())));
    if (!instrument.serial().isBlank()) {
      parts.add(texts.say("instruments.serial", instrument.serial()));
    }
    if (!instrument.tag().isBlank()) {
      parts.add(texts.say("instruments.tag", instrument.tag()));
    }
    facts.setText(String.join(" · ", parts));
  }

  private void hideWhenNarrow(Node node) {
    node.managedProperty().bind(node.visibleProperty());
    node.setVisible(!narrow.get());
    narrow.addListener((property, before, now) -> node.setVisible(!now));
  }
}
