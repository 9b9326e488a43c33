package sillet.desktop.forecast;

import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.util.StringConverter;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Texts;

/** What changes for all strings at once: the set, the tuning, the reference, a capo. */
final class ForecastTerms extends FlowPane {
  private final ForecastModel model;
  private final Texts texts;
  private final Runnable changed;
  private final ComboBox<StringSet> sets = new ComboBox<>();

  ForecastTerms(ForecastModel model, List<StringSet> drawer, Texts texts, Runnable changed) {
    this.model = model;
    this.texts = texts;
    this.changed = changed;
    getStyleClass().add("forecast-terms");
    sets.getItems().setAll(drawer.stream().filter(model::fits).toList());
    sets.setId("forecast-set");
    sets.setAccessibleText(texts.say("forecast.set"));
    sets.setPromptText(texts.say("forecast.set-now"));
    sets.setConverter(new SetName());
    sets.valueProperty()
        .addListener(
            (property, before, now) -> {
              model.take(now);
              changed.run();
            });
    TextField semitones = field(model.semitones(), "semitones", texts.say("forecast.tune"));
    semitones
        .textProperty()
        .addListener(
            (property, before, now) -> {
              model.tune();
              changed.run();
            });
    TextField reference = field(model.reference(), "reference", texts.say("forecast.reference"));
    reference.setPromptText(model.referenceNow());
    Button clear = new Button(texts.say("forecast.clear"));
    clear.setId("forecast-clear");
    clear.setOnAction(pressed -> clear());
    getChildren()
        .addAll(
            part(texts.say("forecast.set"), sets),
            part(texts.say("forecast.tune"), semitones),
            part(texts.say("forecast.reference"), reference),
            part(
                texts.say("forecast.capo"),
                field(model.capo(), "capo", texts.say("forecast.capo"))),
            clear);
  }

  private void clear() {
    sets.setValue(null);
    model.clear();
    changed.run();
  }

  private static HBox part(String name, Node field) {
    Label label = new Label(name);
    label.getStyleClass().add(Looks.NOTE);
    label.setMinWidth(Region.USE_PREF_SIZE);
    HBox part = new HBox(label, field);
    part.getStyleClass().add("forecast-part");
    part.setAlignment(Pos.CENTER_LEFT);
    return part;
  }

  private TextField field(TypedFieldModel<?> typed, String id, String name) {
    TextField field = new TextField();
    field.setId("forecast-" + id);
    field.setAccessibleText(name);
    field.getStyleClass().add("forecast-term");
    field.textProperty().bindBidirectional(typed.typedProperty());
    field.textProperty().addListener((property, before, now) -> changed.run());
    typed
        .problemProperty()
        .addListener(
            (property, before, now) -> field.pseudoClassStateChanged(Looks.ERROR, now.isPresent()));
    return field;
  }

  /** A set by its name; nothing is the set that is on. */
  private final class SetName extends StringConverter<StringSet> {
    @Override
    public String toString(@Nullable StringSet set) {
      return set == null ? texts.say("forecast.set-now") : set.name();
    }

    @Override
    public @Nullable StringSet fromString(String name) {
      return null;
    }
  }
}
