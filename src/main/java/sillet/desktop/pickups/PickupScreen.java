package sillet.desktop.pickups;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
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
import sillet.acoustics.pickups.PickupPlace;
import sillet.desktop.controls.Columns;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.Narrow;
import sillet.desktop.controls.Screen;
import sillet.desktop.controls.TypedField;
import sillet.desktop.theme.Looks;
import sillet.logbook.actions.RecordPickups;
import sillet.logbook.instruments.Neck;
import sillet.logbook.parts.Pickup;
import sillet.logbook.parts.PickupsMeasured;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.VisitRecord;
import sillet.store.reading.InstrumentLine;

/** The pickup sheet of an instrument. */
public final class PickupScreen implements Screen {
  private static final double USUAL_MM = 648;

  private record Fetched(
      Optional<InstrumentLine> line, List<PickupsMeasured> measured, List<VisitRecord> visits) {}

  private final Desk desk;
  private final Texts texts;
  private final UUID instrumentId;
  private final PickupsModel model;
  private final PickupFields fields;
  private final NodePicture open;
  private final NodePicture pressed;
  private final PickupFindings findings;
  private final Label name = new Label();
  private final Label pressedHead = new Label();
  private final Narrow narrow;
  private final VBox page = new VBox();
  private boolean known;

  /**
   * The sheet of an instrument.
   *
   * @param desk what the screen is handed
   * @param instrumentId which
   */
  public PickupScreen(Desk desk, UUID instrumentId) {
    this.desk = desk;
    this.texts = desk.texts();
    this.instrumentId = instrumentId;
    this.model = new PickupsModel(desk.atBench().shop().lengthUnit(), USUAL_MM);
    this.narrow = new Narrow(page);
    this.fields = new PickupFields(model, texts, this::say);
    this.open = new NodePicture(texts.say("pickups.nut"), texts.say("pickups.bridge"));
    this.pressed = new NodePicture(texts.say("pickups.nut"), texts.say("pickups.bridge"));
    this.findings = new PickupFindings(texts, desk.atBench());
    layOut();
    say();
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    fields.focus();
    desk.background().run(this::fetch, this::show, desk.ask()::problem);
  }

  @Override
  public void left() {
    if (known && model.changed()) {
      keep();
    }
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of(new KeyCodeCombination(KeyCode.ENTER, KeyCombination.SHORTCUT_DOWN), this::keep);
  }

  private void layOut() {
    name.setId("pickups-name");
    name.getStyleClass().add(Looks.PAGE_NAME);
    name.setText(texts.say("pickups.sheet"));
    name.setMinWidth(0);
    Button back =
        KeyHint.button(texts.say("pickups.back"), texts.say("pickups.back-key"), desk.goTo()::back);
    Button keep =
        KeyHint.button(texts.say("pickups.keep"), texts.say("pickups.keep-key"), this::keep);
    keep.setId("keep-pickups");
    keep.getStyleClass().add(Looks.PRIMARY);
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox head = new HBox(name, between, KeyHint.line(back, keep));
    head.getStyleClass().addAll(Looks.PANEL, "parts-head");
    Columns columns = new Columns(narrow.narrowProperty(), 52, 48);
    columns.getStyleClass().add("panel-columns");
    columns.show(sheet(), panel(findings));
    ScrollPane pane = new ScrollPane(columns);
    pane.setFitToWidth(true);
    pane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    VBox.setVgrow(pane, Priority.ALWAYS);
    page.getChildren().addAll(head, pane, narrow.measure());
    page.getStyleClass().add("parts-page");
  }

  private VBox sheet() {
    TypedField fret = new TypedField(model.fret(), texts.say("pickups.fret"), texts);
    fret.input().setId("pickups-fret");
    fret.input().getStyleClass().addAll(Looks.FIGURE, "newton-field");
    model.fret().typedProperty().addListener((property, before, now) -> say());
    Label openHead = new Label(texts.say("pickups.open-string"));
    for (Label head : List.of(openHead, pressedHead)) {
      head.getStyleClass().add(Looks.STRONG);
    }
    Label key = new Label(texts.say("pickups.picture-key"));
    key.getStyleClass().add(Looks.NOTE);
    key.setWrapText(true);
    key.setMinHeight(Region.USE_PREF_SIZE);
    HBox line = new HBox(fret);
    line.getStyleClass().add("parts-fields");
    return panel(fields, openHead, open, key, line, pressedHead, pressed);
  }

  private static VBox panel(Node... parts) {
    VBox panel = new VBox(parts);
    panel.getStyleClass().addAll(Looks.PANEL, "parts-panel");
    panel.setMinWidth(0);
    return panel;
  }

  private Fetched fetch() {
    return new Fetched(
        desk.logbook().instruments().instrument(instrumentId),
        desk.logbook().parts().pickups(instrumentId),
        desk.logbook().visits().ofInstrument(instrumentId));
  }

  private void show(Fetched fetched) {
    if (fetched.line().isEmpty()) {
      desk.ask().problem(Message.of("pickups.gone"));
      return;
    }
    var instrument = fetched.line().get().instrument().what();
    name.setText(texts.say("pickups.of", instrument.name()));
    if (!known) {
      known = true;
      Neck neck = instrument.neck();
      model.scale((neck.scaleTrebleMm() + neck.scaleBassMm()) / 2);
      fetched.measured().stream().findFirst().ifPresent(model::take);
    }
    log(fetched);
    say();
  }

  private void log(Fetched fetched) {
    var zone = desk.atBench().clock().getZone();
    findings.log(HeightRow.of(fetched.measured(), fetched.visits(), zone));
  }

  private void say() {
    List<PickupPlace> places = new ArrayList<>();
    List<String> names = new ArrayList<>();
    int number = 1;
    for (PickupLine line : model.lines()) {
      Optional<Pickup> pickup = line.pickup(number++);
      line.listens()
          .ifPresent(
              place -> {
                places.add(place);
                names.add(pickup.map(Pickup::name).orElse(""));
              });
    }
    int fret = model.fret().value().orElse(0);
    open.show(places, names, 0);
    pressed.show(places, names, fret);
    pressedHead.setText(texts.say("pickups.at-fret", Integer.toString(fret)));
    findings.show(model, places, names);
  }

  private void keep() {
    Optional<PickupsMeasured> finished = model.finish(desk.atBench().clock().instant());
    if (!known || finished.isEmpty()) {
      return;
    }
    PickupsMeasured measured = finished.get();
    String technician = desk.atBench().technician();
    desk.background()
        .run(
            () -> {
              desk.logbook().perform(new RecordPickups(instrumentId, measured), technician);
              return fetch();
            },
            fetched -> {
              model.kept(measured);
              desk.sign().saved(desk.atBench().clock().instant());
              log(fetched);
            },
            desk.sign()::notSaved);
  }
}
