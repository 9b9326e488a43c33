package sillet.desktop.intake;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.acoustics.wire.Construction;
import sillet.desktop.controls.ConstructionNames;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.strings.StringSet;
import sillet.logbook.strings.Tuning;
import sillet.logbook.text.Texts;

/** What is on it: a set out of the drawer or string by string, and the tuning. */
final class StringsPanel extends VBox {
  private final IntakeModel model;
  private final Texts texts;
  private final ComboBox<StringSet> sets;
  private final ComboBox<Tuning> tunings;
  private final GridPane table = new GridPane();
  private final Label said = new Label();
  private final List<ComboBox<Construction>> constructions = new ArrayList<>();
  private List<StringSet> drawer = List.of();
  private boolean filling;

  StringsPanel(IntakeModel model, Desk desk) {
    this.model = model;
    this.texts = desk.texts();
    Label head = new Label(texts.say("intake.strings"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    FormGrid above = new FormGrid(texts);
    sets =
        above.choice(
            texts.say("intake.strings.set"), "set", List.of(), StringSet::name, this::setChosen);
    tunings =
        above.choice(
            texts.say("intake.strings.tuning"),
            "tuning",
            List.of(),
            Tuning::name,
            this::tuningChosen);
    table.getStyleClass().add("string-table");
    said.getStyleClass().add(Looks.NOTE);
    said.setWrapText(true);
    FormGrid below = new FormGrid(texts);
    StringsModel strings = model.strings();
    below.words(strings.setName(), texts.say("intake.strings.set-name"), "set-name");
    CheckBox keep = new CheckBox(texts.say("intake.strings.keep"));
    keep.setId("keep-set");
    keep.selectedProperty().addListener((property, before, now) -> strings.keepAsSet(now));
    below.wide(keep);
    below
        .figure(strings.fittedOn(), texts.say("intake.strings.fitted-on"), "fitted-on")
        .setPromptText(texts.say("intake.strings.fitted-prompt"));
    Label caution = new Label(texts.say("intake.strings.caution"));
    caution.getStyleClass().addAll(Looks.CAUTION, Looks.TIGHT);
    caution.setWrapText(true);
    caution.setMinHeight(Region.USE_PREF_SIZE);
    getStyleClass().addAll(Looks.PANEL, "intake-panel");
    getChildren().addAll(head, above, table, said, below, caution);
    make();
  }

  /** Takes what is in the drawer. */
  void drawer(List<StringSet> all) {
    drawer = List.copyOf(all);
    make();
  }

  private void setChosen(StringSet set) {
    if (!filling) {
      model.strings().take(set);
      make();
    }
  }

  private void tuningChosen(Tuning tuning) {
    if (!filling) {
      model.strings().take(tuning);
    }
  }

  /** Makes the lines anew: other strings, another kind. */
  void make() {
    filling = true;
    List<StringLine> lines = model.strings().lines();
    sets.getItems()
        .setAll(drawer.stream().filter(set -> set.strings().size() == lines.size()).toList());
    tunings.getItems().setAll(model.tunings());
    String tuned = model.strings().tuningName().typedProperty().get();
    model.tunings().stream()
        .filter(tuning -> tuning.name().equals(tuned))
        .findFirst()
        .ifPresent(tunings::setValue);
    filling = false;
    table.getChildren().clear();
    constructions.clear();
    heads();
    List<List<TextField>> columns =
        List.of(new ArrayList<>(), new ArrayList<>(), new ArrayList<>());
    for (StringLine line : lines) {
      line(line, columns);
    }
    columns.forEach(StringsPanel::downTheColumn);
  }

  private void heads() {
    String[] heads = {
      "",
      texts.say("intake.strings.pitch"),
      texts.say("intake.strings.gauge"),
      texts.say("intake.strings.construction"),
      texts.say("intake.strings.scale")
    };
    for (int column = 0; column < heads.length; column++) {
      Label head = new Label(heads[column]);
      head.getStyleClass().add(Looks.NOTE);
      table.add(head, column, 0);
    }
  }

  private void line(StringLine line, List<List<TextField>> columns) {
    String number = Integer.toString(line.number());
    Label label = new Label(number);
    label.getStyleClass().addAll(Looks.STRONG, "string-number");
    TextField pitch = cell(line.pitch(), "pitch", line);
    TextField gauge = cell(line.gauge(), "gauge", line);
    TextField scale = cell(line.scale(), "string-scale", line);
    gauge
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now) {
                gaugesTyped();
              }
            });
    columns.get(0).add(pitch);
    columns.get(1).add(gauge);
    columns.get(2).add(scale);
    table.addRow(line.number(), label, pitch, gauge, construction(line), scale);
  }

  private void gaugesTyped() {
    model.gaugesTyped();
    List<StringLine> lines = model.strings().lines();
    filling = true;
    for (int i = 0; i < constructions.size(); i++) {
      constructions.get(i).setValue(lines.get(i).construction());
    }
    filling = false;
  }

  private TextField cell(TypedFieldModel<?> field, String id, StringLine line) {
    TextField cell = new TextField();
    String number = Integer.toString(line.number());
    cell.setId(id + "-" + number);
    cell.getStyleClass().addAll("string-cell", id + "-cell");
    cell.setAccessibleText(texts.say("intake.strings.cell", number, id.replace('-', ' ')));
    cell.textProperty().bindBidirectional(field.typedProperty());
    cell.textProperty().addListener((property, before, now) -> say(field, cell));
    cell.focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (now) {
                cell.selectAll();
              } else {
                field.leave();
              }
              say(field, cell);
            });
    field.problemProperty().addListener((property, before, now) -> say(field, cell));
    return cell;
  }

  private void say(TypedFieldModel<?> field, TextField cell) {
    var problem = field.problemProperty().get();
    cell.pseudoClassStateChanged(Looks.ERROR, problem.isPresent());
    String warned =
        String.join(" ", field.warningsProperty().get().stream().map(texts::say).toList());
    String words =
        problem
            .map(texts::say)
            .orElseGet(() -> warned.isEmpty() ? field.saidBackProperty().get() : warned);
    boolean doubtful = problem.isPresent() || !warned.isEmpty();
    said.getStyleClass().setAll("label", doubtful ? Looks.ERROR_HEAD : Looks.NOTE);
    said.setText(words.isEmpty() ? "" : texts.say("intake.strings.said", cell.getText(), words));
    cell.setAccessibleHelp(words);
  }

  private ComboBox<Construction> construction(StringLine line) {
    ComboBox<Construction> box = new ComboBox<>();
    box.setId("construction-" + line.number());
    box.getStyleClass().add("construction-cell");
    box.getItems().setAll(Construction.values());
    box.setConverter(new ConstructionNames());
    box.setValue(line.construction());
    box.setAccessibleText(
        texts.say("intake.strings.construction-of", Integer.toString(line.number())));
    box.valueProperty()
        .addListener(
            (property, before, now) -> {
              if (!filling && now != null) {
                line.construction(now);
              }
            });
    constructions.add(box);
    return box;
  }

  private static void downTheColumn(List<TextField> column) {
    for (int i = 0; i + 1 < column.size(); i++) {
      TextField next = column.get(i + 1);
      column
          .get(i)
          .addEventFilter(
              KeyEvent.KEY_PRESSED,
              key -> {
                if (key.getCode() == KeyCode.ENTER && !key.isShortcutDown()) {
                  next.requestFocus();
                  key.consume();
                }
              });
    }
  }
}
