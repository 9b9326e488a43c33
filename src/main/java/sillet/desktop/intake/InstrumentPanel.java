package sillet.desktop.intake;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.Predicate;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.shop.Customer;
import sillet.logbook.text.Texts;
import sillet.store.reading.InstrumentLine;

/** What instrument it is. Those the logbook knows are offered by customer, serial, tag or name. */
final class InstrumentPanel extends VBox {
  private final IntakeModel model;
  private final Desk desk;
  private final Texts texts;
  private final Runnable changed;
  private final Consumer<InstrumentLine> chosen;
  private final Label onBench = new Label();
  private final FormGrid form;
  private final Suggestions<InstrumentLine> known =
      new Suggestions<>("known-instruments", this::words, this::choose);
  private final TextField name;
  private final ComboBox<InstrumentKind> kind;
  private final ComboBox<SaddleKind> saddle;
  private final ComboBox<ScrewSense> sense;
  private final CheckBox leftHanded = new CheckBox();
  private final ComboBox<String> screw;
  private final TextField thickness;
  private final Button another = new Button();
  private boolean filling;

  /**
   * The panel.
   *
   * @param model the page
   * @param desk of the window
   * @param changed called when the neck or the kind changed
   * @param chosen takes a known instrument
   */
  InstrumentPanel(IntakeModel model, Desk desk, Runnable changed, Consumer<InstrumentLine> chosen) {
    this.model = model;
    this.desk = desk;
    this.texts = desk.texts();
    this.changed = changed;
    this.chosen = chosen;
    this.form = new FormGrid(texts);
    Label head = new Label(texts.say("intake.instrument"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    InstrumentModel fields = model.instrument();
    kind =
        form.choice(
            texts.say("intake.instrument.kind"),
            "kind",
            List.of(InstrumentKind.values()),
            one -> texts.say(one.key()),
            this::kindChosen);
    field(fields.maker(), texts.say("intake.instrument.maker"), "maker");
    name =
        form.words(
            fields.model(),
            texts.say("intake.instrument.model"),
            "model",
            field -> known.under(field));
    field(fields.serial(), texts.say("intake.instrument.serial"), "serial");
    field(fields.tag(), texts.say("intake.instrument.tag"), "tag");
    neck(fields.neck());
    saddle =
        form.choice(
            texts.say("intake.instrument.saddle"),
            "saddle",
            List.of(SaddleKind.values()),
            one -> texts.say(one.key()),
            this::saddleChosen);
    screw =
        form.typedChoice(
            fields.saddle().screw(),
            texts.say("intake.instrument.screw"),
            "screw",
            ScrewText.threads());
    sense =
        form.choice(
            texts.say("intake.instrument.sense"),
            "sense",
            List.of(ScrewSense.values()),
            one -> texts.say(one.key()),
            fields.saddle()::sense);
    thickness =
        form.figure(
            fields.saddle().thickness(), texts.say("intake.instrument.thickness"), "thickness");
    another.setText(texts.say("intake.instrument.another"));
    another.setOnAction(pressed -> anotherOne());
    getStyleClass().addAll(Looks.PANEL, "intake-panel");
    onBench.getStyleClass().add(Looks.NEEDS_HAND);
    onBench.setWrapText(true);
    getChildren().addAll(head, form, another, onBench);
    name.textProperty().addListener((property, before, now) -> typed(now));
    show();
  }

  private void field(TypedFieldModel<String> field, String label, String id) {
    form.words(field, label, id);
  }

  private void neck(NeckFields neck) {
    form.figure(neck.strings(), texts.say("intake.instrument.strings"), "strings");
    form.figure(neck.scaleTreble(), texts.say("intake.instrument.scale"), "scale");
    form.figure(neck.scaleBass(), texts.say("intake.instrument.scale-bass"), "scale-bass")
        .setPromptText(texts.say("intake.instrument.same"));
    form.figure(neck.frets(), texts.say("intake.instrument.frets"), "frets");
    form.figure(neck.radius(), texts.say("intake.instrument.radius"), "radius")
        .setPromptText(texts.say("intake.instrument.flat"));
    leftHanded.setId("left-handed");
    leftHanded.selectedProperty().addListener((property, before, now) -> neck.leftHanded(now));
    form.tick(texts.say("intake.instrument.left-handed"), leftHanded);
    for (var field : List.of(neck.strings(), neck.scaleTreble(), neck.scaleBass())) {
      field.typedProperty().addListener((property, before, now) -> neckTyped());
    }
  }

  private void neckTyped() {
    if (!filling) {
      model.neckTyped();
      changed.run();
    }
  }

  private void kindChosen(InstrumentKind chosen) {
    if (!filling) {
      filling = true;
      model.kind(chosen);
      filling = false;
      show();
      changed.run();
    }
  }

  private void saddleChosen(SaddleKind chosen) {
    model.instrument().saddle().kind(chosen);
    showSaddle();
  }

  private String words(InstrumentLine line) {
    Instrument instrument = line.instrument().what();
    String mark = instrument.serial().isEmpty() ? instrument.tag() : instrument.serial();
    return mark.isEmpty()
        ? instrument.name()
        : texts.say("intake.instrument.known", instrument.name(), mark);
  }

  /** Offers what a known customer has brought before. */
  void offerOf(Customer customer) {
    if (model.instrument().known().isPresent()) {
      return;
    }
    search(
        customer.name(),
        line -> line.customer() != null && customer.id().equals(line.customer().id()));
  }

  private void typed(String now) {
    if (filling || model.instrument().known().isPresent()) {
      return;
    }
    if (now.isBlank()) {
      known.offer(List.of());
    } else {
      search(now, line -> now.equals(name.getText()));
    }
  }

  private void search(String words, Predicate<InstrumentLine> wanted) {
    desk.background()
        .run(
            () -> desk.logbook().instruments().search(words).newest(),
            found -> known.offer(found.stream().filter(wanted).toList()),
            desk.ask()::problem);
  }

  /** Takes an instrument the logbook knows. */
  void choose(InstrumentLine line) {
    filling = true;
    model.choose(line.instrument().what());
    filling = false;
    known.offer(List.of());
    Integer ticket = line.openTicket();
    onBench.setText(
        ticket == null ? "" : texts.say("intake.instrument.on-bench", Integer.toString(ticket)));
    show();
    changed.run();
    chosen.accept(line);
  }

  private void anotherOne() {
    filling = true;
    model.instrument().anotherOne();
    onBench.setText("");
    filling = false;
    show();
    changed.run();
    name.requestFocus();
  }

  /** Shows what was filled in, and locks what is only to look at. */
  void show() {
    filling = true;
    InstrumentModel fields = model.instrument();
    kind.setValue(fields.kind());
    saddle.setValue(fields.saddle().kind());
    sense.setValue(fields.saddle().sense());
    leftHanded.setSelected(fields.neck().leftHanded());
    boolean isKnown = fields.known().isPresent();
    form.setDisable(isKnown);
    another.setVisible(isKnown);
    another.setManaged(isKnown);
    onBench.setManaged(isKnown);
    showSaddle();
    filling = false;
  }

  private void showSaddle() {
    SaddleFields fields = model.instrument().saddle();
    FormGrid.shows(screw, fields.screwed());
    FormGrid.shows(sense, fields.screwed());
    FormGrid.shows(thickness, fields.onePiece());
  }
}
