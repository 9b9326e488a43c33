package sillet.desktop.visit;

import java.math.BigDecimal;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import sillet.acoustics.readings.Reference;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.readings.ReadingTerms;
import sillet.desktop.visit.readings.ShownFrets;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/** Which frets have cells, what the notes are compared with, how far one reading scatters. */
final class ReadingTermsBar extends BorderPane {
  private final VisitModel model;
  private final Texts texts;
  private final Runnable fretsChanged;
  private final Runnable termsChanged;
  private final TypedFieldModel<ShownFrets> frets;
  private final TypedFieldModel<Double> scatter;
  private final Label said = new Label();
  private final ToggleGroup references = new ToggleGroup();

  ReadingTermsBar(
      VisitModel model, Texts texts, Node wholeNeck, Runnable fretsChanged, Runnable termsChanged) {
    this.model = model;
    this.texts = texts;
    this.fretsChanged = fretsChanged;
    this.termsChanged = termsChanged;
    int onNeck = model.record().instrument().neck().frets();
    this.frets = TypedFieldModel.optional(text -> ShownFrets.parse(text, onNeck));
    this.scatter =
        TypedFieldModel.optional(Readers.number("0.01", "20", texts.say("visit.terms.cents")));
    frets.fill(model.frets().written());
    scatter.fill(scatterInFull());
    said.getStyleClass().add(Looks.ERROR_HEAD);
    said.setMinWidth(0);
    HBox fields =
        new HBox(
            name("visit.terms.frets"),
            field(frets, "shown-frets", texts.say("visit.terms.frets"), this::fretsTyped),
            wholeNeck,
            name("visit.terms.against"),
            against(Reference.OPEN, texts.say("visit.terms.open")),
            against(Reference.HARMONIC, texts.say("visit.terms.harmonic")),
            name("visit.terms.scatter"),
            field(scatter, "scatter", texts.say("visit.terms.scatter"), this::scatterTyped),
            name("visit.terms.cents"));
    fields.getStyleClass().add("terms");
    fields.setAlignment(Pos.CENTER_LEFT);
    setAlignment(said, Pos.CENTER_LEFT);
    setLeft(fields);
    say();
  }

  private Label name(String key) {
    Label label = new Label(texts.say(key));
    label.getStyleClass().addAll(Looks.NOTE);
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  private TextField field(TypedFieldModel<?> typed, String id, String name, Runnable done) {
    TextField field = new TextField();
    field.setId(id);
    field.setAccessibleText(name);
    field.getStyleClass().add("term-field");
    field.setMinWidth(Region.USE_PREF_SIZE);
    field.textProperty().bindBidirectional(typed.typedProperty());
    field.setOnAction(entered -> done.run());
    field
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                done.run();
              }
            });
    typed
        .problemProperty()
        .addListener(
            (property, before, now) -> field.pseudoClassStateChanged(Looks.ERROR, now.isPresent()));
    return field;
  }

  private ToggleButton against(Reference reference, String name) {
    ToggleButton choice = new ToggleButton(name);
    choice.setId("against-" + (reference == Reference.OPEN ? "open" : "harmonic"));
    choice.getStyleClass().add(Looks.CHOICE);
    choice.setMinWidth(Region.USE_PREF_SIZE);
    choice.setToggleGroup(references);
    choice.setSelected(model.terms().against() == reference);
    choice.setOnAction(
        pressed -> {
          choice.setSelected(true);
          model.readUnder(new ReadingTerms(reference, model.terms().sdCents()));
          termsChanged.run();
        });
    return choice;
  }

  private void fretsTyped() {
    if (frets.look()) {
      Optional<ShownFrets> wanted = frets.value();
      if (wanted.isPresent() && !wanted.get().equals(model.frets())) {
        model.show(wanted.get());
        fretsChanged.run();
      }
    }
    say();
  }

  /** Rounded it would be taken for another figure as soon as the field is left. */
  private String scatterInFull() {
    return BigDecimal.valueOf(model.terms().sdCents()).toPlainString();
  }

  private void scatterTyped() {
    if (scatter.look() && !scatter.typedProperty().get().equals(scatterInFull())) {
      Optional<Double> sd = scatter.value();
      if (sd.isPresent() && sd.get() != model.terms().sdCents()) {
        model.readUnder(new ReadingTerms(model.terms().against(), sd.get()));
        termsChanged.run();
      }
    }
    say();
  }

  private void say() {
    Optional<Message> problem =
        frets.problemProperty().get().or(() -> scatter.problemProperty().get());
    said.setText(problem.map(texts::say).orElse(""));
    setBottom(problem.isPresent() ? said : null);
  }
}
