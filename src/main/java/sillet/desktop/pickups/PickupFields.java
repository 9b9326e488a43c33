package sillet.desktop.pickups;

import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import sillet.desktop.controls.TypedCell;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** The fields of the pickups, and under each line what is wrong with it. */
final class PickupFields extends GridPane {
  private final Texts texts;
  private final Runnable changed;
  private TextField first = new TextField();

  PickupFields(PickupsModel model, Texts texts, Runnable changed) {
    this.texts = texts;
    this.changed = changed;
    getStyleClass().add("pickup-fields");
    String[] heads = {
      texts.say("pickups.name"),
      texts.say("pickups.from-bridge"),
      texts.say("pickups.treble"),
      texts.say("pickups.bass")
    };
    for (int column = 0; column < heads.length; column++) {
      Label head = new Label(heads[column]);
      head.getStyleClass().add(Looks.NOTE);
      head.setMinWidth(Region.USE_PREF_SIZE);
      add(head, column, 0);
    }
    int number = 1;
    for (PickupLine line : model.lines()) {
      line(number++, line);
    }
  }

  void focus() {
    first.requestFocus();
  }

  private void line(int number, PickupLine line) {
    String written = Integer.toString(number);
    TextField name = field(line.name(), "pickup-name-" + written, texts.say("pickups.name"));
    TextField place =
        field(line.place(), "pickup-place-" + written, texts.say("pickups.from-bridge"));
    TextField treble =
        field(line.treble(), "pickup-treble-" + written, texts.say("pickups.treble"));
    TextField bass = field(line.bass(), "pickup-bass-" + written, texts.say("pickups.bass"));
    name.getStyleClass().add("pickup-name");
    for (TextField figure : new TextField[] {place, treble, bass}) {
      figure.getStyleClass().addAll(Looks.FIGURE, "fret-field");
    }
    if (number == 1) {
      first = name;
    }
    Label said = new Label();
    said.getStyleClass().add(Looks.ERROR_HEAD);
    said.setWrapText(true);
    said.setMinHeight(Region.USE_PREF_SIZE);
    said.managedProperty().bind(said.textProperty().isNotEmpty());
    for (TypedFieldModel<?> field : line.fields()) {
      field
          .problemProperty()
          .addListener(
              (property, before, now) ->
                  said.setText(line.problem().map(texts::say).orElse("").replace('\n', ' ')));
    }
    addRow(2 * number, name, place, treble, bass);
    add(said, 0, 2 * number + 1, 4, 1);
  }

  private TextField field(TypedFieldModel<?> model, String id, String what) {
    TextField input = TypedCell.of(model);
    input.setId(id);
    input.setAccessibleText(what);
    model.typedProperty().addListener((property, before, now) -> changed.run());
    return input;
  }
}
