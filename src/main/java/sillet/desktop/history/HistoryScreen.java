package sillet.desktop.history;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import javafx.beans.binding.Bindings;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Days;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.ListKeys;
import sillet.desktop.controls.Narrow;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.actions.ForgetLearned;
import sillet.logbook.learned.LearnedInstrument;
import sillet.logbook.learned.Learning;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.VisitRecord;
import sillet.store.Logbook;
import sillet.store.reading.InstrumentLine;

/** One instrument: its visits, and for the chosen one what was before and what is after. */
public final class HistoryScreen implements Screen {
  private record Fetched(
      Optional<InstrumentLine> line,
      List<VisitRecord> visits,
      Optional<LearnedInstrument> learned) {}

  private final Desk desk;
  private final Texts texts;
  private final UUID instrumentId;
  private final HistoryModel model = new HistoryModel();
  private final ListView<VisitRecord> list = new ListView<>(model.visits());
  private final HistoryHead head;
  private final CentsPanel cents;
  private final VisitPanels panels;
  private final LearnedPanel learned;
  private final VBox declined = new VBox();
  private final Label said = new Label();
  private final Button openVisit;
  private final HBox body;
  private final VBox page;

  /**
   * The history of an instrument.
   *
   * @param desk what the screen is handed
   * @param instrumentId which
   */
  public HistoryScreen(Desk desk, UUID instrumentId) {
    this.desk = desk;
    this.texts = desk.texts();
    this.instrumentId = instrumentId;
    HistoryWords words = new HistoryWords(texts, desk.atBench().shop().lengthUnit());
    LocalDate today = LocalDate.now(desk.atBench().clock());
    this.cents = new CentsPanel(texts, today);
    this.page = new VBox();
    Narrow narrow = new Narrow(page);
    this.panels =
        new VisitPanels(texts, words, desk.atBench().clock().getZone(), narrow.narrowProperty());
    this.learned = new LearnedPanel(texts, narrow.narrowProperty(), this::forget);
    this.openVisit =
        KeyHint.button(
            texts.say("history.open-visit"), texts.say("history.open-visit-key"), this::openVisit);
    openVisit.setId("open-visit");
    Button newVisit =
        KeyHint.button(
            texts.say("history.new-visit"), texts.say("history.new-visit-key"), this::newVisit);
    newVisit.setId("new-visit");
    newVisit.getStyleClass().add(Looks.PRIMARY);
    this.head = new HistoryHead(texts, words, narrow.narrowProperty(), openVisit, newVisit);
    list.setCellFactory(view -> new VisitCell(texts, words));
    this.body = new HBox(visitsPanel(narrow), right());
    body.getStyleClass().add("panel-row");
    said.setId("history-said");
    said.setWrapText(true);
    StackPane below = new StackPane(body, said);
    below.getStyleClass().add("list-body");
    VBox.setVgrow(below, Priority.ALWAYS);
    page.getChildren().addAll(head, below, narrow.measure());
    page.getStyleClass().add("history-page");
    listen();
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    list.requestFocus();
    desk.background().run(this::fetch, this::show, this::failed);
  }

  @Override
  public void left() {
    // a history holds nothing that could be lost
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(
        new KeyCodeCombination(KeyCode.N, KeyCombination.SHORTCUT_DOWN),
        this::newVisit,
        new KeyCodeCombination(KeyCode.F, KeyCombination.SHORTCUT_DOWN),
        () -> desk.goTo().frets(instrumentId),
        new KeyCodeCombination(KeyCode.P, KeyCombination.SHORTCUT_DOWN),
        () -> desk.goTo().pickups(instrumentId));
  }

  private void listen() {
    ListKeys.teach(list, this::openVisit, desk.goTo()::back);
    list.getSelectionModel()
        .selectedItemProperty()
        .addListener(
            (property, before, now) -> {
              if (now != null) {
                model.chosenProperty().set(Optional.of(now));
              }
            });
    model.chosenProperty().addListener((property, before, now) -> say());
    model.troubleProperty().addListener((property, before, now) -> say());
    say();
  }

  private VBox visitsPanel(Narrow narrow) {
    Label name = new Label(texts.say("history.visits-head"));
    name.getStyleClass().add(Looks.PANEL_HEAD);
    Label order = new Label(texts.say("history.newest-first"));
    order.getStyleClass().add(Looks.NOTE);
    HBox line = new HBox(name, order);
    line.getStyleClass().add("panel-line");
    list.setId("visit-list");
    list.getStyleClass().add("visit-list");
    list.setAccessibleText(texts.say("history.visits-head"));
    VBox.setVgrow(list, Priority.ALWAYS);
    declined.getStyleClass().add("declined");
    FlowPane parts = parts();
    // in a tight page the list needs the room; the keys lead there all the same
    parts.visibleProperty().bind(Bindings.not(narrow.tightProperty()));
    parts.managedProperty().bind(parts.visibleProperty());
    VBox panel = new VBox(line, list, declined, parts);
    panel.getStyleClass().addAll(Looks.PANEL, "visits-panel");
    return panel;
  }

  /** The sheets of parts that are measured by themselves. */
  private FlowPane parts() {
    Button frets =
        KeyHint.button(
            texts.say("history.frets"),
            texts.say("history.frets-key"),
            () -> desk.goTo().frets(instrumentId));
    frets.setId("fret-sheet");
    Button pickups =
        KeyHint.button(
            texts.say("history.pickups"),
            texts.say("history.pickups-key"),
            () -> desk.goTo().pickups(instrumentId));
    pickups.setId("pickup-sheet");
    FlowPane parts = new FlowPane(frets, pickups);
    parts.getStyleClass().add("choice-flow");
    return parts;
  }

  private ScrollPane right() {
    VBox.setVgrow(panels, Priority.ALWAYS);
    VBox column = new VBox(cents, panels, learned);
    column.getStyleClass().add("panel-column");
    ScrollPane pane = new ScrollPane(column);
    pane.setFitToWidth(true);
    pane.setFitToHeight(true);
    pane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    HBox.setHgrow(pane, Priority.ALWAYS);
    return pane;
  }

  private Fetched fetch() {
    Logbook logbook = desk.logbook();
    List<VisitRecord> visits = logbook.visits().ofInstrument(instrumentId);
    return new Fetched(
        logbook.instruments().instrument(instrumentId), visits, learned(logbook, visits));
  }

  /** The newest visit stands first. */
  private static Optional<LearnedInstrument> learned(Logbook logbook, List<VisitRecord> visits) {
    return visits.stream()
        .findFirst()
        .flatMap(newest -> Learning.of(newest, logbook.visits().past(newest)));
  }

  private void show(Fetched fetched) {
    boolean first = !body.isVisible();
    model.show(fetched.line(), fetched.visits());
    model.instrumentProperty().get().ifPresent(head::show);
    model.chosenProperty().get().ifPresent(visit -> list.getSelectionModel().select(visit));
    learned.show(fetched.learned());
    showDeclined();
    say();
    if (first && body.isVisible()) {
      list.requestFocus();
    }
  }

  private void failed(Message why) {
    model.troubleProperty().set(Optional.of(why));
  }

  private void say() {
    Optional<Message> trouble = model.troubleProperty().get();
    Optional<VisitRecord> chosen = model.chosenProperty().get();
    boolean known = model.instrumentProperty().get().isPresent();
    said.getStyleClass().setAll("label", trouble.isPresent() ? Looks.NEEDS_HAND : Looks.SENTENCE);
    said.setText(
        trouble
            .map(texts::say)
            .orElse(known && chosen.isEmpty() ? texts.say("history.empty") : ""));
    said.setVisible(!said.getText().isEmpty());
    body.setVisible(chosen.isPresent());
    openVisit.setDisable(chosen.isEmpty());
    chosen.ifPresent(
        visit -> {
          cents.show(model.oldestFirst(), visit);
          panels.show(visit);
        });
  }

  private void showDeclined() {
    declined.getChildren().clear();
    for (HistoryModel.Declined one : model.declined()) {
      if (declined.getChildren().isEmpty()) {
        Label name = new Label(texts.say("history.declined"));
        name.getStyleClass().add(Looks.PANEL_HEAD);
        declined.getChildren().add(name);
      }
      Label day = new Label(Days.full(one.day()));
      day.getStyleClass().add(Looks.NOTE);
      Label text = new Label(one.text());
      text.setWrapText(true);
      declined.getChildren().addAll(day, text);
    }
  }

  /** Asks first: what was learned cannot be called back, though every reading stays. */
  private void forget() {
    if (desk.ask().confirm(Message.of("history.forget-sure"))) {
      Instant now = desk.atBench().clock().instant();
      String technician = desk.atBench().technician();
      desk.background()
          .run(
              () -> {
                desk.logbook().perform(new ForgetLearned(instrumentId, now), technician);
                return fetch();
              },
              fetched -> {
                desk.sign().saved(now);
                show(fetched);
              },
              desk.sign()::notSaved);
    }
  }

  private void openVisit() {
    model.chosenProperty().get().ifPresent(visit -> desk.goTo().visit(visit.visit().ticket()));
  }

  private void newVisit() {
    desk.goTo().takeIn(instrumentId);
  }
}
