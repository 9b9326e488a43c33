package sillet.desktop.history;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import javafx.geometry.HPos;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Days;
import sillet.desktop.controls.StringStory;
import sillet.desktop.drawing.NoteName;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.visits.VisitRecord;

/** Cents at fret 12 of every string over the years, with the figures of one visit beside them. */
final class CentsPanel extends VBox {
  private final Texts texts;
  private final LocalDate today;
  private final GridPane grid = new GridPane();
  private final Label which = new Label();

  CentsPanel(Texts texts, LocalDate today) {
    this.texts = texts;
    this.today = today;
    Label head = new Label(texts.say("history.cents"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    which.getStyleClass().add(Looks.NOTE);
    head.setMinWidth(Region.USE_PREF_SIZE);
    HBox line = new HBox(head, key(false, "history.as-received"), key(true, "history.as-left"));
    line.getStyleClass().add("panel-line");
    grid.getStyleClass().add("cents-grid");
    grid.getColumnConstraints().addAll(column(false), column(false), column(true));
    grid.getColumnConstraints().addAll(figures(), figures());
    getChildren().addAll(line, grid);
    getStyleClass().add(Looks.PANEL);
  }

  /** Shows all visits, and the figures of the chosen one. */
  void show(List<VisitRecord> oldestFirst, VisitRecord chosen) {
    grid.getChildren().clear();
    int ticket = chosen.visit().ticket();
    which.setText(
        texts.say(
            "history.figures-of",
            Days.full(chosen.visit().arrival().takenIn()),
            Integer.toString(ticket)));
    List<LocalDate> days = new ArrayList<>();
    oldestFirst.forEach(visit -> days.add(visit.visit().arrival().takenIn()));
    YearAxis axis = YearAxis.over(days, today);
    grid.add(which, 2, 0);
    GridPane.setHalignment(which, HPos.RIGHT);
    grid.add(note("history.received"), 3, 0);
    grid.add(note("history.left"), 4, 0);
    int row = 1;
    for (StringStory story : StringStory.of(chosen)) {
      CentsHistory history = CentsHistory.of(story.string().number(), oldestFirst);
      string(row++, story, new CentsRow(history, axis, ticket));
    }
    grid.add(new YearRow(axis), 2, row);
  }

  private void string(int row, StringStory story, CentsRow plot) {
    Label number = new Label(Integer.toString(story.string().number()));
    number.getStyleClass().add(Looks.STRONG);
    String received = cents(story.received());
    String left = cents(story.left());
    plot.setAccessibleText(
        texts.say(
            "history.cents-said",
            number.getText(),
            story.string().pitch().typed(),
            received,
            left));
    Label newer = figure(left);
    newer.getStyleClass().add(Looks.STRONG);
    grid.add(number, 0, row);
    grid.add(new NoteName(story.string().pitch().typed(), false), 1, row);
    grid.add(plot, 2, row);
    grid.add(figure(received), 3, row);
    grid.add(newer, 4, row);
  }

  private static String cents(OptionalDouble value) {
    return value.isPresent() ? Figures.signed(value.getAsDouble(), 1) : "";
  }

  private static Label figure(String text) {
    Label figure = new Label(text);
    figure.getStyleClass().add(Looks.FIGURE);
    figure.setMinWidth(Region.USE_PREF_SIZE);
    return figure;
  }

  private Label note(String key) {
    Label label = new Label(texts.say(key));
    label.getStyleClass().add(Looks.NOTE);
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  private HBox key(boolean full, String textKey) {
    DotKey dot = new DotKey(full);
    Label word = new Label(texts.say(textKey));
    word.getStyleClass().add(Looks.TIGHT);
    HBox line = new HBox(dot, word);
    line.getStyleClass().add("dot-key");
    return line;
  }

  private static ColumnConstraints column(boolean grows) {
    ColumnConstraints column = new ColumnConstraints();
    column.setHgrow(grows ? Priority.ALWAYS : Priority.NEVER);
    column.setFillWidth(grows);
    return column;
  }

  private static ColumnConstraints figures() {
    ColumnConstraints column = new ColumnConstraints();
    column.setHalignment(HPos.RIGHT);
    return column;
  }
}
