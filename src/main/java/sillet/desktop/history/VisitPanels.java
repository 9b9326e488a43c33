package sillet.desktop.history;

import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import javafx.beans.value.ObservableBooleanValue;
import javafx.geometry.HPos;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Columns;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.VisitRecord;
import sillet.logbook.visits.WorkLine;

/** The chosen visit: checks, moves made, work and notes, side by side. */
final class VisitPanels extends VBox {
  private static final DateTimeFormatter TIME = DateTimeFormatter.ofPattern("HH:mm", Locale.ROOT);

  private final Texts texts;
  private final HistoryWords words;
  private final ZoneId zone;
  private final Columns columns;

  VisitPanels(Texts texts, HistoryWords words, ZoneId zone, ObservableBooleanValue narrow) {
    this.texts = texts;
    this.words = words;
    this.zone = zone;
    this.columns = new Columns(narrow, 36, 36, 28);
    columns.getStyleClass().add("panel-columns");
    VBox.setVgrow(columns, Priority.ALWAYS);
    getChildren().add(columns);
  }

  void show(VisitRecord visit) {
    columns.show(checks(visit), moves(visit), work(visit));
  }

  private VBox checks(VisitRecord visit) {
    List<CheckLine> lines = CheckLine.of(visit);
    GridPane grid = grid(1, 2);
    if (!lines.isEmpty()) {
      grid.add(note("history.received"), 1, 0);
      grid.add(note("history.left"), 2, 0);
    }
    int row = 1;
    for (CheckLine line : lines) {
      Label left = figure(length(line.leftMm()));
      left.getStyleClass().add(Looks.STRONG);
      grid.add(wrapped(words.check(line.what())), 0, row);
      grid.add(figure(length(line.receivedMm())), 1, row);
      grid.add(left, 2, row++);
    }
    return panel(
        "history.checks", words.unit(), lines.isEmpty() ? none("history.no-checks") : grid);
  }

  private VBox moves(VisitRecord visit) {
    GridPane grid = grid(2);
    int row = 0;
    for (MadeMove move : visit.moves()) {
      Label string = figure(Integer.toString(move.string()));
      string.getStyleClass().add(Looks.STRONG);
      Label turns = figure(words.turns(move));
      turns.getStyleClass().add(Looks.NOTE);
      grid.add(string, 0, row);
      grid.add(wrapped(words.moved(move)), 1, row);
      grid.add(turns, 2, row++);
    }
    boolean none = visit.moves().isEmpty();
    return panel("history.moves", "", none ? none("history.no-moves") : grid);
  }

  private VBox work(VisitRecord visit) {
    VBox lines = new VBox();
    lines.getStyleClass().add("work-lines");
    for (WorkLine line : visit.work()) {
      lines.getChildren().add(said(TIME.format(line.at().atZone(zone)), line.text()));
    }
    for (VisitNote note : visit.notes()) {
      lines.getChildren().add(said(texts.say(note.kind().key()), note.text()));
    }
    boolean none = lines.getChildren().isEmpty();
    return panel("history.work", "", none ? none("history.no-work") : lines);
  }

  private static HBox said(String first, String text) {
    Label before = new Label(first);
    before.getStyleClass().addAll(Looks.NOTE, "work-first");
    before.setMinWidth(Region.USE_PREF_SIZE);
    Label what = wrapped(text);
    HBox.setHgrow(what, Priority.ALWAYS);
    HBox line = new HBox(before, what);
    line.getStyleClass().add("work-line");
    return line;
  }

  private String length(@Nullable Double mm) {
    return mm == null ? "" : words.length(mm);
  }

  private VBox panel(String headKey, String unit, Node body) {
    Label head = new Label(texts.say(headKey));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    Label unitLabel = new Label(unit);
    unitLabel.getStyleClass().add(Looks.NOTE);
    HBox line = new HBox(head, unitLabel);
    line.getStyleClass().add("panel-line");
    VBox panel = new VBox(line, body);
    panel.getStyleClass().addAll(Looks.PANEL, "history-panel");
    panel.setMinWidth(0);
    return panel;
  }

  private Label none(String key) {
    Label label = new Label(texts.say(key));
    label.getStyleClass().add(Looks.SOFT);
    label.setWrapText(true);
    return label;
  }

  private Label note(String key) {
    Label label = new Label(texts.say(key));
    label.getStyleClass().add(Looks.NOTE);
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  /** Level with the first line of what stands beside it. */
  private static Label figure(String text) {
    Label label = new Label(text);
    label.setMinWidth(Region.USE_PREF_SIZE);
    GridPane.setValignment(label, VPos.TOP);
    return label;
  }

  private static Label wrapped(String text) {
    Label label = new Label(text);
    label.setWrapText(true);
    label.setMinWidth(0);
    return label;
  }

  /** A grid of figures: the columns named stand right-aligned, the one before them grows. */
  private static GridPane grid(int... figures) {
    GridPane grid = new GridPane();
    grid.getStyleClass().add("figure-grid");
    for (int i = 0; i <= figures[figures.length - 1]; i++) {
      ColumnConstraints column = new ColumnConstraints();
      if (i >= figures[0]) {
        column.setHalignment(HPos.RIGHT);
        column.setMinWidth(Region.USE_PREF_SIZE);
      } else if (i == figures[0] - 1) {
        column.setHgrow(Priority.ALWAYS);
      }
      grid.getColumnConstraints().add(column);
    }
    return grid;
  }
}
