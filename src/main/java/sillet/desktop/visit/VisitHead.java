package sillet.desktop.visit;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import sillet.desktop.drawing.Perforation;
import sillet.desktop.drawing.strings.SheetShape;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** The ticket at the head of the page: its stub, the instrument, the customer, the days. */
final class VisitHead extends HBox {
  private final Texts texts;
  private final VisitHeadWords words;

  VisitHead(Texts texts) {
    this.texts = texts;
    this.words = new VisitHeadWords(texts);
    getStyleClass().addAll(Looks.PANEL, "visit-head");
  }

  /** Shows the visit in the shape of the window. */
  void show(VisitModel model, SheetShape shape) {
    boolean narrow = shape == SheetShape.NARROW;
    boolean flat = narrow || model.record().visit().strings().strings().size() > 8;
    getChildren().setAll(stub(model, flat), new Perforation(), instrument(model, narrow));
    if (!narrow) {
      getChildren().add(customer(model));
    }
    getChildren().add(days(model, narrow));
  }

  private VBox stub(VisitModel model, boolean flat) {
    Label number = label(Integer.toString(model.record().visit().ticket()), Looks.TICKET_NUMBER);
    number.setId("ticket");
    number.setMinWidth(USE_PREF_SIZE);
    VBox stub = new VBox();
    if (!flat) {
      stub.getChildren().add(label(texts.say("visit.head.ticket"), Looks.NOTE));
    }
    stub.getChildren().add(number);
    stub.getStyleClass().add(Looks.TICKET_STUB);
    stub.setMinWidth(USE_PREF_SIZE);
    return stub;
  }

  private VBox instrument(VisitModel model, boolean narrow) {
    Label name = label(model.record().instrument().name(), Looks.PAGE_NAME);
    List<Label> lines = new ArrayList<>();
    if (narrow) {
      Label customer = label(words.customer(model.record()), Looks.TIGHT);
      HBox first = new HBox(name, customer);
      first.getStyleClass().add("head-line");
      first.setAlignment(Pos.BASELINE_LEFT);
      VBox block = new VBox(first, request(model));
      grow(block);
      return block;
    }
    lines.add(name);
    lines.add(label(words.instrument(model.record().instrument()), Looks.TIGHT, Looks.SOFT));
    lines.add(request(model));
    VBox block = new VBox();
    block.getChildren().addAll(lines);
    grow(block);
    return block;
  }

  private Label request(VisitModel model) {
    String said = model.record().visit().arrival().request();
    Label request = label(texts.say("visit.head.request", said), Looks.CUSTOMER_WORDS);
    request.setId("request");
    request.setWrapText(true);
    request.setMinHeight(USE_PREF_SIZE);
    return request;
  }

  private static void grow(VBox block) {
    block.getStyleClass().add("head-block");
    block.setMinWidth(0);
    HBox.setHgrow(block, Priority.ALWAYS);
  }

  private VBox customer(VisitModel model) {
    var customer = model.record().customer();
    VBox block = new VBox();
    block.getStyleClass().addAll("head-block", "head-customer");
    if (customer == null) {
      block.getChildren().add(label(texts.say("visit.head.nobody"), Looks.SOFT));
      return block;
    }
    block.getChildren().add(label(customer.name(), Looks.STRONG));
    block.getChildren().add(label(customer.phone(), Looks.TIGHT, Looks.SOFT));
    block.getChildren().add(label(customer.note(), Looks.TIGHT, Looks.SOFT));
    return block;
  }

  private VBox days(VisitModel model, boolean narrow) {
    VBox block = new VBox();
    block.getStyleClass().addAll("head-block", "head-days");
    block.setAlignment(Pos.TOP_RIGHT);
    for (String line : words.days(model.record(), narrow)) {
      boolean first = block.getChildren().isEmpty();
      Label label = first ? label(line, Looks.STRONG) : label(line, Looks.TIGHT, Looks.SOFT);
      label.setMinWidth(USE_PREF_SIZE);
      block.getChildren().add(label);
    }
    block.setMinWidth(USE_PREF_SIZE);
    return block;
  }

  private static Label label(String text, String... looks) {
    Label label = new Label(text);
    label.getStyleClass().addAll(looks);
    label.setTextOverrun(OverrunStyle.ELLIPSIS);
    label.setMinWidth(0);
    return label;
  }
}
