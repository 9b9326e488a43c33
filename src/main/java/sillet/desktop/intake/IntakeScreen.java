package sillet.desktop.intake;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.UUID;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.shop.Customer;
import sillet.logbook.shop.Shop;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.VisitRecord;
import sillet.store.reading.InstrumentLine;

/** Taking in an instrument on one page. */
public final class IntakeScreen implements Screen {
  private static final String SHEET = sheet();

  private final Desk desk;
  private final Texts texts;
  private final IntakeModel model;
  private final IntakeSaving saving;
  private final CustomerPanel customer;
  private final InstrumentPanel instrument;
  private final StringsPanel strings;
  private final ScrollPane pane = new ScrollPane();
  private final Label trouble = new Label();

  /**
   * The page.
   *
   * @param desk of the window
   * @param instrumentId what comes in again; null where it is chosen or made here
   */
  public IntakeScreen(Desk desk, @Nullable UUID instrumentId) {
    this.desk = desk;
    this.texts = desk.texts();
    Shop shop = desk.atBench().shop();
    LocalDate today = LocalDate.now(desk.atBench().clock());
    this.model =
        new IntakeModel(
            shop,
            UsualThings.load(),
            today,
            UUID::randomUUID,
            new PlausibleIntake(shop.lengthUnit()));
    this.saving = new IntakeSaving(desk, model, desk.goTo()::visit, this::notTaken);
    this.strings = new StringsPanel(model, desk);
    this.instrument = new InstrumentPanel(model, desk, strings::make, this::chosen);
    this.customer = new CustomerPanel(model.customer(), desk, instrument::offerOf);
    pane.setContent(page());
    pane.setFitToWidth(true);
    pane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    pane.getStyleClass().add("intake-pane");
    pane.getStylesheets().add(SHEET);
    load(instrumentId);
  }

  private static String sheet() {
    var place = IntakeScreen.class.getResource("/sillet/desktop/intake.css");
    return Objects.requireNonNull(place, "intake.css is missing from the program").toExternalForm();
  }

  private void load(@Nullable UUID instrumentId) {
    desk.background()
        .run(() -> desk.logbook().stringSets().all(), strings::drawer, desk.ask()::problem);
    if (instrumentId != null) {
      desk.background()
          .run(
              () -> desk.logbook().instruments().instrument(instrumentId),
              found -> found.ifPresent(this::cameAgain),
              desk.ask()::problem);
    }
  }

  private void cameAgain(InstrumentLine line) {
    instrument.choose(line);
  }

  /** A known instrument: whoever has it now, and the strings it had when it was here last. */
  private void chosen(InstrumentLine line) {
    Customer owner = line.customer();
    if (owner != null && model.customer().blank()) {
      customer.choose(owner);
    }
    UUID id = line.instrument().what().id();
    desk.background()
        .run(
            () -> desk.logbook().visits().ofInstrument(id),
            this::strungAsLast,
            desk.ask()::problem);
  }

  private void strungAsLast(List<VisitRecord> newestFirst) {
    newestFirst.stream()
        .findFirst()
        .ifPresent(
            last -> {
              model.strings().take(last.visit().strings());
              strings.make();
            });
  }

  private VBox page() {
    Label head = new Label(texts.say("intake.head"));
    head.getStyleClass().add(Looks.PAGE_NAME);
    trouble.setId("intake-trouble");
    trouble.getStyleClass().add(Looks.NEEDS_HAND);
    trouble.setWrapText(true);
    trouble.setMinWidth(0);
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    Button take =
        KeyHint.button(texts.say("intake.take"), texts.say("intake.take-key"), this::take);
    take.setId("take-in");
    take.getStyleClass().add(Looks.PRIMARY);
    take.setMinWidth(Region.USE_PREF_SIZE);
    HBox line = new HBox(head, trouble, between, take);
    line.getStyleClass().addAll(Looks.PANEL, "intake-head");
    line.setAlignment(Pos.CENTER_LEFT);
    ArrivalPanel arrival = new ArrivalPanel(model.arrival(), texts);
    VBox first = new VBox(customer, arrival);
    first.getStyleClass().add("panels");
    VBox.setVgrow(arrival, Priority.ALWAYS);
    VBox page = new VBox(line, new IntakeColumns(List.of(first, instrument, strings)));
    page.getStyleClass().addAll(Looks.PAGE, "intake-page");
    return page;
  }

  private void take() {
    trouble.setText("");
    if (model.look()) {
      saving.begin();
    } else {
      trouble.setText(texts.say("intake.wrong"));
      focusWrong();
    }
  }

  /** The first field that cannot be taken, so that nobody has to look for it. */
  private void focusWrong() {
    for (Node field : pane.getContent().lookupAll(".text-input")) {
      if (field.getPseudoClassStates().contains(Looks.ERROR)) {
        field.requestFocus();
        return;
      }
    }
  }

  private void notTaken() {
    trouble.setText(texts.say("intake.not-taken"));
    customer.show();
    instrument.show();
  }

  @Override
  public Node node() {
    return pane;
  }

  @Override
  public void shown() {
    // a scroll pane takes its content in when it is styled; before that nothing in it can be lit
    pane.applyCss();
    pane.layout();
    customer.focus();
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(new KeyCodeCombination(KeyCode.ENTER, KeyCombination.SHORTCUT_DOWN), this::take);
  }

  @Override
  public void left() {
    // what is typed is not part of the record before it is taken in
  }
}
