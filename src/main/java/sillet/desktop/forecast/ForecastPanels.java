package sillet.desktop.forecast;

import java.util.List;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Columns;
import sillet.desktop.drawing.Mark;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.theme.Looks;
import sillet.logbook.forecast.InstrumentForecast;
import sillet.logbook.forecast.StringForecast;
import sillet.logbook.text.Texts;

/** Under the strings: what must be redone, all strings together, and where it can hurt. */
final class ForecastPanels {
  private final Texts texts;
  private final VBox redo = panel();
  private final VBox all = panel();
  private final Columns columns;

  ForecastPanels(Texts texts, ObservableBooleanValue narrow) {
    this.texts = texts;
    this.columns = new Columns(narrow, 50, 50);
    columns.getStyleClass().add("forecast-columns");
    columns.show(redo, all);
  }

  Columns node() {
    return columns;
  }

  private static VBox panel() {
    VBox panel = new VBox();
    panel.getStyleClass().addAll(Looks.PANEL, "forecast-panel");
    panel.setMaxHeight(Double.MAX_VALUE);
    return panel;
  }

  void show(InstrumentForecast forecast, ForecastWords words) {
    redo.getChildren().setAll(head(texts.say("forecast.redo")));
    List<String> again = words.redo(forecast);
    again.forEach(line -> redo.getChildren().add(toDo(line)));
    if (again.isEmpty()) {
      redo.getChildren().add(sentence(texts.say("forecast.nothing"), Looks.SOFT));
    }
    all.getChildren()
        .setAll(head(texts.say("forecast.all")), sentence(words.pull(forecast), Looks.SENTENCE));
    words
        .cautions(forecast)
        .forEach(caution -> all.getChildren().add(sentence(caution, Looks.CAUTION)));
    for (StringForecast string : forecast.strings()) {
      String number = Integer.toString(string.then().number());
      for (String note : words.line(string).notes()) {
        all.getChildren().add(sentence(texts.say("forecast.note", number, note), Looks.TIGHT));
      }
    }
  }

  private static Label head(String text) {
    Label head = new Label(text);
    head.getStyleClass().add(Looks.PANEL_HEAD);
    return head;
  }

  private static HBox toDo(String text) {
    Label words = sentence(text, Looks.SENTENCE);
    HBox line = new HBox(Mark.small(MarkShape.NOT_YET, ""), words);
    line.getStyleClass().add("forecast-do");
    return line;
  }

  private static Label sentence(String text, String look) {
    Label label = new Label(text);
    label.getStyleClass().add(look);
    label.setWrapText(true);
    label.setMinWidth(0);
    label.setMinHeight(Region.USE_PREF_SIZE);
    return label;
  }
}
