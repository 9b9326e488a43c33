package sillet.desktop.forecast;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.value.ObservableBooleanValue;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.forecast.InstrumentForecast;
import sillet.logbook.forecast.StringForecast;
import sillet.logbook.forecast.StringTension;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** A row a string: what changes on it, and what that asks for. */
final class ForecastTable extends GridPane {
  private static final int BARS = 4;

  private final Texts texts;
  private final Runnable changed;
  private final List<TensionBars> bars = new ArrayList<>();
  private final List<ForecastResult> results = new ArrayList<>();
  private final List<TextField> pitches = new ArrayList<>();
  private final List<TextField> gauges = new ArrayList<>();
  private final List<TextField> actions = new ArrayList<>();

  ForecastTable(ForecastModel model, Texts texts, ObservableBooleanValue narrow, Runnable changed) {
    this.texts = texts;
    this.changed = changed;
    getStyleClass().add("forecast-table");
    heads();
    model.rows().forEach(this::row);
    downTheColumn(pitches);
    downTheColumn(gauges);
    downTheColumn(actions);
    columns(narrow.get());
    narrow.addListener((property, before, now) -> columns(now));
  }

  private void columns(boolean narrow) {
    getColumnConstraints().clear();
    for (int column = 0; column <= BARS; column++) {
      ColumnConstraints one = new ColumnConstraints();
      one.setHgrow(column == BARS ? Priority.ALWAYS : Priority.NEVER);
      getColumnConstraints().add(one);
    }
    for (Node node : getChildren()) {
      if (GridPane.getColumnIndex(node) == BARS) {
        node.setVisible(!narrow);
        node.setManaged(!narrow);
      }
    }
  }

  private void heads() {
    String[] heads = {
      texts.say("forecast.string"),
      texts.say("forecast.pitch"),
      texts.say("forecast.gauge"),
      texts.say("forecast.action"),
      texts.say("forecast.bars"),
      texts.say("forecast.tension"),
      texts.say("forecast.left-alone"),
      texts.say("forecast.saddle")
    };
    for (int column = 0; column < heads.length; column++) {
      Label head = new Label(heads[column]);
      head.getStyleClass().add(Looks.NOTE);
      head.setMinWidth(column == BARS ? 0 : Region.USE_PREF_SIZE);
      add(head, column, 0);
    }
  }

  private void row(ForecastRow row) {
    int line = row.now().number();
    String number = Integer.toString(line);
    Label name = new Label(number);
    name.getStyleClass().addAll(Looks.STRONG, "forecast-number");
    Label what =
        new Label(row.now().pitch().typed() + " " + Figures.gauge(row.now().make().gaugeIn()));
    what.setMinWidth(Region.USE_PREF_SIZE);
    HBox string = new HBox(name, what);
    string.getStyleClass().add("forecast-part");
    string.setAlignment(Pos.CENTER_LEFT);
    pitches.add(cell(row.pitch(), "pitch-" + number, texts.say("forecast.pitch-of", number)));
    gauges.add(cell(row.gauge(), "gauge-" + number, texts.say("forecast.gauge-of", number)));
    actions.add(cell(row.action(), "action-" + number, texts.say("forecast.action-of", number)));
    pitches.get(line - 1).setPromptText(row.now().pitch().typed());
    gauges.get(line - 1).setPromptText(Figures.gauge(row.now().make().gaugeIn()));
    actions.get(line - 1).setPromptText(texts.say("forecast.as-now"));
    TensionBars bar = new TensionBars();
    bars.add(bar);
    ForecastResult result = new ForecastResult(texts);
    results.add(result);
    addRow(line, string, pitches.get(line - 1), gauges.get(line - 1), actions.get(line - 1), bar);
    add(result.tension(), BARS + 1, line);
    add(result.leftAlone(), BARS + 2, line);
    add(result.saddle(), BARS + 3, line);
  }

  private TextField cell(TypedFieldModel<?> field, String id, String name) {
    TextField cell = new TextField();
    cell.setId("forecast-" + id);
    cell.getStyleClass().add("forecast-cell");
    cell.setMinWidth(Region.USE_PREF_SIZE);
    cell.setAccessibleText(name);
    cell.textProperty().bindBidirectional(field.typedProperty());
    cell.textProperty().addListener((property, before, now) -> changed.run());
    field
        .problemProperty()
        .addListener(
            (property, before, now) -> cell.pseudoClassStateChanged(Looks.ERROR, now.isPresent()));
    return cell;
  }

  /** Enter goes down the strings. */
  private static void downTheColumn(List<TextField> cells) {
    for (int i = 0; i + 1 < cells.size(); i++) {
      TextField next = cells.get(i + 1);
      cells.get(i).setOnAction(entered -> next.requestFocus());
    }
  }

  /** Puts the focus where one begins. */
  void focus() {
    pitches.get(0).requestFocus();
  }

  /** Shows what the change asks for. */
  void show(InstrumentForecast forecast, ForecastWords words) {
    double most = 0;
    double sum = 0;
    int counted = 0;
    for (StringForecast string : forecast.strings()) {
      StringTension tension = string.tension();
      if (tension != null) {
        most = Math.max(most, Math.max(tension.nowN(), tension.thenN()));
        sum += tension.thenN();
        counted++;
      }
    }
    for (int i = 0; i < results.size(); i++) {
      StringForecast string = forecast.strings().get(i);
      StringTension tension = string.tension();
      results.get(i).show(words.line(string));
      bars.get(i)
          .show(
              tension == null ? 0 : tension.nowN(),
              tension == null ? 0 : tension.thenN(),
              counted == 0 ? 0 : sum / counted,
              most * 1.05);
    }
  }
}
