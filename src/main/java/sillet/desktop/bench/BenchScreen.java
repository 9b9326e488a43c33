package sillet.desktop.bench;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.ListKeys;
import sillet.desktop.controls.Narrow;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.VisitRecord;
import sillet.store.Logbook;
import sillet.store.reading.VisitLine;

/** The open visits by promised day. Enter opens one. */
public final class BenchScreen implements Screen {
  private final Desk desk;
  private final Texts texts;
  private final BenchModel model = new BenchModel();
  private final ListView<BenchRow> list = new ListView<>(model.rows());
  private final Label count = new Label();
  private final Label said = new Label();
  private final Button takeIn;
  private final HBox columns;
  private final VBox page = new VBox();

  /** The bench of the logbook on a desk. */
  public BenchScreen(Desk desk) {
    this.desk = desk;
    this.texts = desk.texts();
    this.takeIn =
        KeyHint.button(texts.say("bench.take-in"), texts.say("bench.take-in-key"), this::takeIn);
    takeIn.setId("take-in");
    takeIn.getStyleClass().add(Looks.PRIMARY);
    Narrow narrow = new Narrow(page);
    this.columns = BenchColumns.heads(texts, narrow);
    list.setId("bench-list");
    list.getStyleClass().add("bench-list");
    list.setAccessibleText(texts.say("bench.open-visits"));
    list.setCellFactory(view -> new BenchCell(model, texts, narrow));
    ListKeys.teach(list, this::openChosen, desk.goTo()::back);
    model.troubleProperty().addListener((property, before, now) -> say());
    said.setId("bench-said");
    said.setWrapText(true);
    VBox.setVgrow(list, Priority.ALWAYS);
    StackPane body = new StackPane(list, said);
    body.getStyleClass().add("list-body");
    VBox.setVgrow(body, Priority.ALWAYS);
    page.getChildren().addAll(heading(), columns, body, narrow.measure());
    page.getStyleClass().add("list-page");
    say();
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    (model.empty() ? takeIn : list).requestFocus();
    desk.background().run(this::fetch, this::show, this::failed);
  }

  @Override
  public void left() {
    // a list holds nothing that could be lost
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(new KeyCodeCombination(KeyCode.N, KeyCombination.SHORTCUT_DOWN), this::takeIn);
  }

  private HBox heading() {
    Label name = new Label(texts.say("bench.bench"));
    name.getStyleClass().add(Looks.PAGE_NAME);
    count.getStyleClass().add(Looks.SOFT);
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox line = new HBox(name, count, between, KeyHint.line(takeIn));
    line.getStyleClass().add("page-heading");
    return line;
  }

  private List<VisitRecord> fetch() {
    Logbook logbook = desk.logbook();
    List<VisitRecord> visits = new ArrayList<>();
    for (VisitLine line : logbook.visits().open()) {
      logbook.visits().byTicket(line.ticket()).ifPresent(visits::add);
    }
    return visits;
  }

  private void show(List<VisitRecord> visits) {
    BenchRow chosen = list.getSelectionModel().getSelectedItem();
    model.show(visits, LocalDate.now(desk.atBench().clock()));
    if (!model.rows().isEmpty()) {
      int place = chosen == null ? 0 : Math.max(0, model.indexOf(chosen.ticket()));
      list.getSelectionModel().select(place);
      list.getFocusModel().focus(place);
    }
    say();
    if (model.empty() && list.isFocused()) {
      takeIn.requestFocus();
    }
  }

  private void failed(Message why) {
    model.troubleProperty().set(Optional.of(why));
  }

  private void say() {
    Optional<Message> trouble = model.troubleProperty().get();
    int open = model.rows().size();
    count.setText(
        open == 0
            ? ""
            : open == 1
                ? texts.say("bench.one")
                : texts.say("bench.count", Integer.toString(open)));
    said.getStyleClass().setAll("label", trouble.isPresent() ? Looks.NEEDS_HAND : Looks.SENTENCE);
    said.setText(trouble.map(texts::say).orElse(model.empty() ? texts.say("bench.nothing") : ""));
    said.setVisible(!said.getText().isEmpty());
    columns.setVisible(!model.rows().isEmpty());
    columns.setManaged(columns.isVisible());
  }

  private void takeIn() {
    desk.goTo().takeIn(null);
  }

  private void openChosen() {
    BenchRow chosen = list.getSelectionModel().getSelectedItem();
    if (chosen != null) {
      desk.goTo().visit(chosen.ticket());
    }
  }
}
