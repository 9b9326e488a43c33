package sillet.desktop.visit;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.beans.value.ChangeListener;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.actions.Action;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.VisitRecord;

/** The page of one visit. */
public final class VisitScreen implements Screen {
  private static final String SHEET = sheet();
  private static final KeyCombination HISTORY = shortcut(KeyCode.H);

  private final Desk desk;
  private final int ticket;
  private final ScrollPane pane = new ScrollPane();
  private final Label waiting = new Label();
  private @Nullable VisitParts parts;
  private @Nullable VisitModel model;
  private @Nullable Saves saves;
  private final ChangeListener<Node> focusFollower = (property, before, now) -> focused(now);
  private boolean shown;

  /**
   * The page of a visit; it is read in the background.
   *
   * @param desk of the window
   * @param ticket number of the visit
   */
  public VisitScreen(Desk desk, int ticket) {
    this.desk = desk;
    this.ticket = ticket;
    pane.setFitToWidth(true);
    pane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    pane.getStyleClass().add("visit-pane");
    pane.getStylesheets().add(SHEET);
    waiting.getStyleClass().add(Looks.SOFT);
    VBox blank = new VBox(waiting);
    blank.getStyleClass().add(Looks.PAGE);
    pane.setContent(blank);
    pane.addEventHandler(KeyEvent.KEY_PRESSED, this::escape);
    pane.addEventFilter(KeyEvent.KEY_PRESSED, this::historyFirst);
    desk.background().run(this::readWithPast, this::loaded, why -> waiting.setText(say(why)));
  }

  private static String sheet() {
    var place = VisitScreen.class.getResource("/sillet/desktop/visit.css");
    return Objects.requireNonNull(place, "visit.css is missing from the program").toExternalForm();
  }

  private String say(Message message) {
    return desk.texts().say(message);
  }

  private VisitRecord read() {
    return desk.logbook()
        .visits()
        .byTicket(ticket)
        .orElseThrow(() -> Rejection.of("visit.no-such", Integer.toString(ticket)));
  }

  private record WithPast(VisitRecord record, InstrumentPast past) {}

  private WithPast readWithPast() {
    VisitRecord record = read();
    return new WithPast(record, desk.logbook().visits().past(record));
  }

  private void loaded(WithPast read) {
    MoveAdvisor advisor = advisor();
    VisitModel visit = new VisitModel(read.record(), read.past(), advisor, desk.atBench().clock());
    Saves onTheWay =
        new Saves(
            desk.background(),
            desk.sign(),
            desk.atBench().clock(),
            this::perform,
            this::read,
            this::kept);
    VisitDesk together = new VisitDesk(desk, visit, onTheWay);
    VisitParts made = new VisitParts(together, new WordsOfVisit(desk.texts(), advisor), buttons());
    model = visit;
    saves = onTheWay;
    parts = made;
    pane.setContent(made.node());
    made.width(pane.getWidth());
    pane.widthProperty().addListener((property, before, now) -> made.width(now.doubleValue()));
    if (shown) {
      begin(made);
    }
  }

  /** What leads on from the page. */
  private List<Button> buttons() {
    Button forecast =
        KeyHint.button(
            desk.texts().say("forecast.forecast"),
            desk.texts().say("visit.key.forecast"),
            this::forecast);
    forecast.setId("forecast");
    Button past =
        KeyHint.button(
            desk.texts().say("visit.history"),
            desk.texts().say("visit.key.history"),
            this::history);
    Button sheet =
        KeyHint.button(
            desk.texts().say("visit.job-sheet"),
            desk.texts().say("visit.key.job-sheet"),
            this::export);
    sheet.setId("job-sheet");
    return List.of(forecast, past, sheet);
  }

  private void perform(Action action) {
    desk.logbook().perform(action, desk.atBench().technician());
  }

  private void kept(VisitRecord record) {
    if (parts != null && model != null) {
      parts.take(record);
      if (model.draft()) {
        desk.sign().draft(desk.atBench().clock().instant());
      }
    }
  }

  private void focused(@Nullable Node now) {
    if (parts != null && now != null) {
      parts.focused(now);
      ScrollIntoView.show(pane, now);
    }
  }

  @Override
  public Node node() {
    return pane;
  }

  @Override
  public void shown() {
    shown = true;
    pane.getScene().focusOwnerProperty().addListener(focusFollower);
    if (parts != null) {
      begin(parts);
    }
  }

  /** A scroll pane takes its content in when it is styled; before that nothing can be lit. */
  private void begin(VisitParts page) {
    pane.applyCss();
    pane.layout();
    page.focusStart();
  }

  @Override
  public void left() {
    shown = false;
    pane.requestFocus();
    pane.getScene().focusOwnerProperty().removeListener(focusFollower);
    if (saves != null && saves.failure() != null) {
      desk.ask().problem(Message.of("visit.left-unsaved", saves.written()));
    }
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    Map<KeyCombination, Runnable> keys = new HashMap<>();
    keys.put(new KeyCodeCombination(KeyCode.F8), () -> with(page -> page.made().key()));
    keys.put(shortcut(KeyCode.E), this::export);
    keys.put(shortcut(KeyCode.S), this::saveAgain);
    keys.put(shortcut(KeyCode.L), () -> with(VisitParts::focusWork));
    keys.put(shortcut(KeyCode.T), () -> with(VisitParts::focusNotes));
    keys.put(HISTORY, this::history);
    keys.put(shortcut(KeyCode.F), this::forecast);
    keys.put(shortcut(KeyCode.ENTER), () -> with(VisitParts::handOut));
    keys.put(new KeyCodeCombination(KeyCode.F4), () -> with(VisitParts::turnAbout));
    keys.put(new KeyCodeCombination(KeyCode.F5), () -> with(page -> page.aim().nextAim()));
    keys.put(
        new KeyCodeCombination(KeyCode.F5, KeyCombination.SHIFT_DOWN),
        () -> with(page -> page.aim().nextNut()));
    keys.put(new KeyCodeCombination(KeyCode.F7), () -> with(VisitParts::neckByKey));
    keys.put(new KeyCodeCombination(KeyCode.F6), () -> walk(1));
    keys.put(new KeyCodeCombination(KeyCode.F6, KeyCombination.SHIFT_DOWN), () -> walk(-1));
    keys.put(shortcut(KeyCode.PAGE_UP), () -> look(-1));
    keys.put(shortcut(KeyCode.PAGE_DOWN), () -> look(1));
    return keys;
  }

  private static KeyCombination shortcut(KeyCode code) {
    return new KeyCodeCombination(code, KeyCombination.SHORTCUT_DOWN);
  }

  private void with(Consumer<VisitParts> does) {
    Optional.ofNullable(parts).ifPresent(does);
  }

  private void look(int step) {
    if (parts != null && model != null) {
      parts.look(model.pass() + step);
      parts.focusStart();
    }
  }

  private void walk(int step) {
    var scene = pane.getScene();
    if (parts != null && scene != null && scene.getFocusOwner() != null) {
      parts.walk(scene.getFocusOwner(), step);
    }
  }

  /** A text field would take this key for a backspace and wipe the reading it stands in. */
  private void historyFirst(KeyEvent event) {
    if (HISTORY.match(event)) {
      history();
      event.consume();
    }
  }

  private void escape(KeyEvent event) {
    if (event.getCode() == KeyCode.ESCAPE && parts != null && parts.made().on()) {
      parts.made().end();
      parts.focusStart();
      event.consume();
    }
  }

  private void forecast() {
    desk.goTo().forecast(ticket);
  }

  private void history() {
    if (model != null) {
      desk.goTo().history(model.record().instrument().id());
    }
  }

  private void saveAgain() {
    if (saves != null) {
      saves.tryAgain();
    }
  }

  /** What is being typed is kept first, so that the sheet holds it. */
  private void export() {
    if (parts != null) {
      pane.requestFocus();
      parts.export(new JobSheetExport(desk, advisor(), this::read), ticket);
    }
  }

  private MoveAdvisor advisor() {
    return new MoveAdvisor(desk.atBench().shop().breakingSharePercent());
  }
}
