package sillet.desktop.frets;

import java.time.LocalDate;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.ToggleButton;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Columns;
import sillet.desktop.controls.Days;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Narrow;
import sillet.desktop.controls.Screen;
import sillet.desktop.controls.TypedField;
import sillet.desktop.theme.Looks;
import sillet.logbook.actions.RecordFretPlaces;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.store.reading.InstrumentLine;

/** The fret sheet of an instrument; any scale may be typed over its own. */
public final class FretScreen implements Screen {
  private static final double USUAL_MM = 648;
  private static final int USUAL_FRETS = 22;

  private record Fetched(Optional<InstrumentLine> line, List<FretPlaces> measured) {}

  private final Desk desk;
  private final Texts texts;
  private final UUID instrumentId;
  private final FretSheetModel model;
  private final FretTable table;
  private final FretFindings findings;
  private final Label name = new Label();
  private final Button keep;
  private final ToggleButton nominal;
  private final ToggleButton own;
  private final Narrow narrow;
  private final VBox page = new VBox();
  private String measuredOn = "";
  private boolean known;

  /**
   * The sheet of an instrument.
   *
   * @param desk what the screen is handed
   * @param instrumentId which
   */
  public FretScreen(Desk desk, UUID instrumentId) {
    this.desk = desk;
    this.texts = desk.texts();
    this.instrumentId = instrumentId;
    this.model = new FretSheetModel(desk.atBench().shop().lengthUnit(), USUAL_MM, USUAL_FRETS);
    this.narrow = new Narrow(page);
    this.table = new FretTable(model, texts, desk.atBench().shop().lengthUnit(), this::say);
    this.findings = new FretFindings(texts);
    this.keep = KeyHint.button(texts.say("frets.keep"), texts.say("frets.keep-key"), this::keep);
    keep.setId("keep-frets");
    keep.getStyleClass().add(Looks.PRIMARY);
    this.nominal = choice(texts.say("frets.hold-nominal"), FretSheetModel.Against.NOMINAL);
    this.own = choice(texts.say("frets.hold-own"), FretSheetModel.Against.FRETS);
    nominal.setId("hold-nominal");
    own.setId("hold-own");
    layOut();
    say();
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    table.focus();
    desk.background().run(this::fetch, this::show, this::failed);
  }

  @Override
  public void left() {
    if (known && model.changed()) {
      keep();
    }
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    Map<KeyCombination, Runnable> keys = new HashMap<>();
    keys.put(new KeyCodeCombination(KeyCode.ENTER, KeyCombination.SHORTCUT_DOWN), this::keep);
    keys.put(new KeyCodeCombination(KeyCode.F7), this::holdOther);
    return keys;
  }

  private void layOut() {
    name.setId("frets-name");
    name.getStyleClass().add(Looks.PAGE_NAME);
    name.setText(texts.say("frets.sheet"));
    name.setMinWidth(0);
    Button back =
        KeyHint.button(texts.say("frets.back"), texts.say("frets.back-key"), desk.goTo()::back);
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox head = new HBox(name, between, KeyHint.line(back, keep));
    head.getStyleClass().addAll(Looks.PANEL, "parts-head");
    Columns columns = new Columns(narrow.narrowProperty(), 64, 36);
    columns.getStyleClass().add("panel-columns");
    columns.show(sheet(), said());
    ScrollPane pane = new ScrollPane(columns);
    pane.setFitToWidth(true);
    pane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    VBox.setVgrow(pane, Priority.ALWAYS);
    page.getChildren().addAll(head, pane, narrow.measure());
    page.getStyleClass().add("parts-page");
    narrow.narrowProperty().addListener((property, before, now) -> say());
  }

  private VBox sheet() {
    TypedField scale = new TypedField(model.scale(), texts.say("frets.scale"), texts);
    scale.input().setId("frets-scale");
    TypedField count = new TypedField(model.frets(), texts.say("frets.count"), texts);
    count.input().setId("frets-count");
    for (TypedField field : List.of(scale, count)) {
      field.input().getStyleClass().addAll(Looks.FIGURE, "newton-field");
      field.setMinWidth(0);
    }
    model.scale().typedProperty().addListener((property, before, now) -> say());
    model.frets().typedProperty().addListener((property, before, now) -> say());
    HBox fields = new HBox(scale, count);
    fields.getStyleClass().add("parts-fields");
    FlowPane hold = new FlowPane(nominal, own, hint());
    hold.getStyleClass().add("choice-flow");
    VBox sheet = new VBox(fields, hold, table.problem(), table);
    sheet.getStyleClass().addAll(Looks.PANEL, "parts-panel");
    sheet.setMinWidth(0);
    return sheet;
  }

  private Label hint() {
    Label key = new Label(texts.say("frets.hold-key"));
    key.getStyleClass().add(Looks.KEY_HINT);
    return key;
  }

  private VBox said() {
    VBox panel = new VBox(findings);
    panel.getStyleClass().addAll(Looks.PANEL, "parts-panel");
    panel.setMinWidth(0);
    return panel;
  }

  private ToggleButton choice(String words, FretSheetModel.Against against) {
    ToggleButton button = new ToggleButton(words);
    button.getStyleClass().add(Looks.CHOICE);
    button.setOnAction(
        pressed -> {
          model.hold(against);
          say();
        });
    return button;
  }

  private void holdOther() {
    model.hold(
        model.against() == FretSheetModel.Against.FRETS
            ? FretSheetModel.Against.NOMINAL
            : FretSheetModel.Against.FRETS);
    say();
  }

  private Fetched fetch() {
    return new Fetched(
        desk.logbook().instruments().instrument(instrumentId),
        desk.logbook().parts().frets(instrumentId));
  }

  private void show(Fetched fetched) {
    if (fetched.line().isEmpty()) {
      failed(Message.of("frets.gone"));
      return;
    }
    Instrument instrument = fetched.line().get().instrument().what();
    name.setText(texts.say("frets.of", instrument.name()));
    if (!known) {
      known = true;
      model.fill(instrument.neck().scaleTrebleMm(), instrument.neck().frets());
      fetched.measured().stream().findFirst().ifPresent(model::take);
    }
    measured(fetched.measured());
    say();
  }

  private void measured(List<FretPlaces> all) {
    if (!all.isEmpty()) {
      LocalDate day = LocalDate.ofInstant(all.get(0).at(), desk.atBench().clock().getZone());
      String many = Integer.toString(all.size());
      measuredOn =
          all.size() == 1
              ? texts.say("frets.measured-on", Days.full(day))
              : texts.say("frets.measured-times", Days.full(day), many);
    }
  }

  private void failed(Message why) {
    desk.ask().problem(why);
  }

  private void say() {
    boolean enough = model.byAll().isPresent();
    own.setDisable(!enough);
    nominal.setSelected(model.against() == FretSheetModel.Against.NOMINAL);
    own.setSelected(model.against() == FretSheetModel.Against.FRETS);
    table.show(narrow.narrowProperty().get());
    findings.show(model, measuredOn);
  }

  private void keep() {
    Optional<FretPlaces> finished = model.finish(desk.atBench().clock().instant());
    if (!known || finished.isEmpty()) {
      table.focusProblem();
      return;
    }
    FretPlaces measured = finished.get();
    String technician = desk.atBench().technician();
    desk.background()
        .run(
            () -> {
              desk.logbook().perform(new RecordFretPlaces(instrumentId, measured), technician);
              return desk.logbook().parts().frets(instrumentId);
            },
            all -> {
              model.kept(measured);
              desk.sign().saved(desk.atBench().clock().instant());
              measured(all);
              say();
            },
            desk.sign()::notSaved);
  }
}
