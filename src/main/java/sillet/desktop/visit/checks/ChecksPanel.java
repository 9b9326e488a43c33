package sillet.desktop.visit.checks;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.BiConsumer;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;

/** The table of checks. */
public final class ChecksPanel extends VBox {
  private static final int COLUMNS = 6;

  private final ChecksModel model;
  private final Texts texts;
  private final BiConsumer<CheckRow, Moment> save;
  private final GridPane table = new GridPane();
  private final Label said = new Label();
  private final Button every = new Button();
  private boolean editable = true;
  private boolean narrow;

  /**
   * A table.
   *
   * @param model the checks
   * @param texts the words
   * @param save called when a field of a row is done
   */
  public ChecksPanel(ChecksModel model, Texts texts, BiConsumer<CheckRow, Moment> save) {
    this.model = model;
    this.texts = texts;
    this.save = save;
    Label name = new Label(texts.say("visit.checks"));
    name.getStyleClass().add(Looks.PANEL_HEAD);
    every.setOnAction(pressed -> turnEvery());
    every.getStyleClass().add("quiet");
    BorderPane head = new BorderPane();
    head.setLeft(name);
    head.setRight(every);
    BorderPane.setAlignment(name, Pos.CENTER_LEFT);
    table.getStyleClass().add("check-table");
    said.setText(texts.say("visit.checks.unit"));
    said.getStyleClass().add(Looks.NOTE);
    said.setWrapText(true);
    said.setMinHeight(Region.USE_PREF_SIZE);
    getStyleClass().addAll(Looks.PANEL, "checks");
    getChildren().addAll(head, table, said);
    make();
  }

  private void turnEvery() {
    model.showEveryString(!model.everyString());
    make();
    every.requestFocus();
  }

  /** Nothing is typed any more once the instrument was handed out. */
  public void editable(boolean open) {
    editable = open;
    make();
  }

  /** In a narrow column each check takes two lines: its name, below it the figures. */
  public void setNarrow(boolean inColumn) {
    if (narrow != inColumn) {
      narrow = inColumn;
      make();
    }
  }

  /** Makes the rows anew. */
  public void make() {
    every.setText(texts.say(model.everyString() ? "visit.checks.outer" : "visit.checks.every"));
    table.getChildren().clear();
    heads();
    Map<Moment, List<CheckCell>> columns = new EnumMap<>(Moment.class);
    int line = 1;
    CheckKind before = null;
    for (CheckRow row : model.rows()) {
      row(row, line, row.kind() != before, columns);
      before = row.kind();
      line++;
    }
    columns.values().forEach(ChecksPanel::downTheColumn);
  }

  private void heads() {
    String[] heads = {
      "",
      narrow ? "" : texts.say("visit.checks.string-head"),
      texts.say("visit.checks.fret"),
      texts.say("visit.checks.how"),
      texts.say("moment.received"),
      texts.say("moment.left")
    };
    for (int column = 0; column < heads.length; column++) {
      Label head = new Label(heads[column]);
      head.getStyleClass().addAll(Looks.NOTE, "column-head");
      head.setMinWidth(Region.USE_PREF_SIZE);
      table.add(head, column, 0);
    }
  }

  private void row(
      CheckRow row, int line, boolean firstOfKind, Map<Moment, List<CheckCell>> columns) {
    String name = name(row);
    Label label = new Label(narrow ? name : texts.say(row.kind().key()));
    label.setMinWidth(Region.USE_PREF_SIZE);
    if (narrow) {
      table.add(label, 0, 2 * line - 1, COLUMNS, 1);
    } else {
      label.setVisible(firstOfKind);
      table.add(label, 0, line);
      table.add(number(row), 1, line);
    }
    int figures = narrow ? 2 * line : line;
    if (row.fretChosen()) {
      CheckCell fret =
          new CheckCell(
              row.fret(), texts.say("visit.checks.fret-of", name), () -> fretChanged(row));
      fret.setId("check-" + row.kind().word() + "-" + row.string() + "-fret");
      fret.getStyleClass().add("fret-cell");
      fret.setEditable(editable);
      table.add(fret, 2, figures);
    }
    Node method = method(row);
    GridPane.setHgrow(method, Priority.ALWAYS);
    boolean noFret = narrow && !row.fretChosen();
    table.add(method, noFret ? 2 : 3, figures, noFret ? 2 : 1, 1);
    for (Moment moment : Moment.values()) {
      CheckCell cell = cell(row, moment, name);
      columns.computeIfAbsent(moment, first -> new ArrayList<>()).add(cell);
      table.add(cell, moment == Moment.RECEIVED ? 4 : 5, figures);
    }
  }

  private static Label number(CheckRow row) {
    boolean whole = row.string() == BenchCheck.WHOLE_NECK;
    Label number = new Label(whole ? "" : Integer.toString(row.string()));
    number.getStyleClass().addAll(Looks.STRONG, "check-number");
    return number;
  }

  private CheckCell cell(CheckRow row, Moment moment, String name) {
    String spoken = texts.say("visit.checks.cell", name, texts.say(moment.key()));
    CheckCell cell = new CheckCell(row.value(moment), spoken, () -> save.accept(row, moment));
    cell.setId("check-" + row.kind().word() + "-" + row.string() + "-" + moment.word());
    cell.setEditable(editable);
    cell.textProperty().addListener((property, before, now) -> say(cell));
    cell.focusedProperty().addListener((property, before, now) -> say(cell));
    return cell;
  }

  private void say(CheckCell cell) {
    String words = cell.said(texts);
    said.getStyleClass().setAll("label", cell.doubtful() ? Looks.ERROR_HEAD : Looks.NOTE);
    String unit = texts.say("visit.checks.unit");
    said.setText(words.isEmpty() ? unit : texts.say("visit.checks.said", cell.getText(), words));
  }

  private String name(CheckRow row) {
    String kind = texts.say(row.kind().key());
    return row.string() == BenchCheck.WHOLE_NECK
        ? kind
        : texts.say("visit.checks.string", kind, Integer.toString(row.string()));
  }

  /** How it is measured; where there is a choice, a press takes the next way. */
  private Node method(CheckRow row) {
    List<CheckMethod> ways = ways(row.kind());
    if (ways.size() == 1) {
      Label only = new Label(texts.say(row.method().key()));
      only.getStyleClass().addAll(Looks.NOTE, "check-way");
      return only;
    }
    Button way = new Button(texts.say(row.method().key()));
    way.getStyleClass().add("quiet");
    way.setDisable(!editable);
    way.setAccessibleText(
        texts.say("visit.checks.how-of", name(row), texts.say(row.method().key())));
    way.setOnAction(
        pressed -> {
          int next = (ways.indexOf(row.method()) + 1) % ways.size();
          row.measuredBy(ways.get(next));
          way.setText(texts.say(row.method().key()));
          fretChanged(row);
        });
    return way;
  }

  private void fretChanged(CheckRow row) {
    for (Moment moment : Moment.values()) {
      save.accept(row, moment);
    }
  }

  private static List<CheckMethod> ways(CheckKind kind) {
    return switch (kind) {
      case RELIEF -> List.of(CheckMethod.STRAIGHTEDGE, CheckMethod.STRING);
      case ACTION -> List.of(CheckMethod.OPEN, CheckMethod.CAPO_1);
      case FIRST_FRET_CLEARANCE -> List.of(CheckMethod.OPEN, CheckMethod.PRESSED_3);
      case PICKUP_HEIGHT -> List.of(CheckMethod.PRESSED_LAST);
      case SADDLE_HEIGHT -> List.of(CheckMethod.OPEN);
    };
  }

  private static void downTheColumn(List<CheckCell> column) {
    for (int i = 0; i + 1 < column.size(); i++) {
      column.get(i).then(column.get(i + 1)::requestFocus);
    }
  }
}
