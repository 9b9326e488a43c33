package sillet.desktop.instruments;

import java.util.Map;
import java.util.UUID;
import javafx.animation.PauseTransition;
import javafx.beans.property.StringProperty;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.ListKeys;
import sillet.desktop.controls.Narrow;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.store.reading.InstrumentLine;

/** Instruments, as the words in the search field find them. Enter opens an instrument's history. */
public final class InstrumentsScreen implements Screen {
  private static final Duration PAUSE = Duration.millis(180);

  private final Desk desk;
  private final Texts texts;
  private final StringProperty typed;
  private final InstrumentsModel model = new InstrumentsModel();
  private final ListView<InstrumentLine> list = new ListView<>(model.lines());
  private final PauseTransition pause = new PauseTransition(PAUSE);
  private final Label heading = new Label();
  private final Label said = new Label();
  private final Button newVisit;
  private final Button newInstrument;
  private final VBox page = new VBox();

  /**
   * The instruments of the logbook on a desk.
   *
   * @param desk what the screen is handed
   * @param typed the words of the search field in the top line
   */
  public InstrumentsScreen(Desk desk, StringProperty typed) {
    this.desk = desk;
    this.texts = desk.texts();
    this.typed = typed;
    this.newVisit =
        KeyHint.button(
            texts.say("instruments.new-visit"),
            texts.say("instruments.new-visit-key"),
            this::takeInChosen);
    newVisit.setId("new-visit");
    newVisit.disableProperty().bind(list.getSelectionModel().selectedItemProperty().isNull());
    this.newInstrument =
        KeyHint.button(
            texts.say("instruments.new-instrument"),
            texts.say("instruments.new-instrument-key"),
            this::takeInNew);
    newInstrument.setId("new-instrument");
    newInstrument.getStyleClass().add(Looks.PRIMARY);
    pause.setOnFinished(over -> search());
    typed.addListener((property, before, now) -> pause.playFromStart());
    layOut();
    say();
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    boolean typing =
        page.getScene() != null && page.getScene().getFocusOwner() instanceof TextInputControl;
    if (!typing) {
      list.requestFocus();
    }
    search();
  }

  @Override
  public void left() {
    pause.stop();
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(
        new KeyCodeCombination(KeyCode.N, KeyCombination.SHORTCUT_DOWN),
        this::takeInChosen,
        new KeyCodeCombination(KeyCode.N, KeyCombination.SHORTCUT_DOWN, KeyCombination.SHIFT_DOWN),
        this::takeInNew);
  }

  private void layOut() {
    Narrow narrow = new Narrow(page);
    list.setId("instrument-list");
    list.getStyleClass().add("instrument-list");
    list.setAccessibleText(texts.say("instruments.list"));
    list.setCellFactory(view -> new InstrumentCell(texts, narrow.narrowProperty()));
    ListKeys.teach(list, this::openChosen, desk.goTo()::back);
    model.troubleProperty().addListener((property, before, now) -> say());
    said.setId("instruments-said");
    said.setWrapText(true);
    StackPane body = new StackPane(list, said);
    body.getStyleClass().add("list-body");
    VBox.setVgrow(body, Priority.ALWAYS);
    page.getChildren().addAll(headingLine(), body, narrow.measure());
    page.getStyleClass().add("list-page");
  }

  private HBox headingLine() {
    Label name = new Label(texts.say("instruments.instruments"));
    name.getStyleClass().add(Looks.PAGE_NAME);
    heading.setId("instrument-count");
    heading.getStyleClass().add(Looks.SOFT);
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox line = new HBox(name, heading, between, KeyHint.line(newVisit, newInstrument));
    line.getStyleClass().add("page-heading");
    return line;
  }

  private void search() {
    int number = model.ask();
    String words = typed.get();
    desk.background()
        .run(
            () -> desk.logbook().instruments().search(words),
            found -> {
              InstrumentLine chosen = list.getSelectionModel().getSelectedItem();
              model.answer(number, words, found);
              choose(chosen);
              say();
            },
            why -> model.failed(number, why));
  }

  /** Keeps the instrument that was chosen, else chooses the first. */
  private void choose(@Nullable InstrumentLine before) {
    int place = 0;
    for (int i = 0; before != null && i < model.lines().size(); i++) {
      if (id(model.lines().get(i)).equals(id(before))) {
        place = i;
      }
    }
    if (!model.lines().isEmpty()) {
      list.getSelectionModel().select(place);
      list.getFocusModel().focus(place);
    }
  }

  private void say() {
    Message trouble = model.troubleProperty().get().orElse(null);
    heading.setText(texts.say(model.heading()));
    said.getStyleClass().setAll("label", trouble == null ? Looks.SENTENCE : Looks.NEEDS_HAND);
    said.setText(
        trouble == null ? model.emptySentence().map(texts::say).orElse("") : texts.say(trouble));
    said.setVisible(!said.getText().isEmpty());
  }

  private void openChosen() {
    InstrumentLine chosen = list.getSelectionModel().getSelectedItem();
    if (chosen != null) {
      desk.goTo().instrument(id(chosen));
    }
  }

  private void takeInChosen() {
    InstrumentLine chosen = list.getSelectionModel().getSelectedItem();
    if (chosen != null) {
      desk.goTo().takeIn(id(chosen));
    }
  }

  private void takeInNew() {
    desk.goTo().takeIn(null);
  }

  private static UUID id(InstrumentLine line) {
    return line.instrument().what().id();
  }
}
