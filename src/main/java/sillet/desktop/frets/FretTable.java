package sillet.desktop.frets;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.geometry.HPos;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import sillet.desktop.controls.TypedCell;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/** The frets line by line, with a field for each place that was measured. */
final class FretTable extends GridPane {
  private static final int TO_LAST = 3;
  private static final int FIELD = 4;
  private static final int BAR = 7;

  private final FretSheetModel model;
  private final Texts texts;
  private final LengthUnit unit;
  private final List<Line> lines = new ArrayList<>();
  private final Label problem = new Label();

  /** The labels of one line that change. */
  private record Line(
      Label number,
      Label fromNut,
      Label before,
      Label toLast,
      TextField field,
      Label off,
      Label cents,
      CostBar bar) {
    List<Region> all() {
      return List.of(number, fromNut, before, toLast, field, off, cents, bar);
    }
  }

  FretTable(FretSheetModel model, Texts texts, LengthUnit unit, Runnable changed) {
    this.model = model;
    this.texts = texts;
    this.unit = unit;
    getStyleClass().add("fret-table");
    for (int column = 0; column <= BAR; column++) {
      ColumnConstraints one = new ColumnConstraints();
      one.setHalignment(column == FIELD || column == BAR ? HPos.LEFT : HPos.RIGHT);
      if (column == BAR) {
        one.setHgrow(Priority.ALWAYS);
      } else {
        one.setMinWidth(Region.USE_PREF_SIZE);
      }
      getColumnConstraints().add(one);
    }
    heads();
    for (int fret = 1; fret <= FretSheetModel.MOST_FRETS; fret++) {
      line(fret, changed);
    }
    problem.getStyleClass().add(Looks.ERROR_HEAD);
    problem.setWrapText(true);
    problem.setMinHeight(Region.USE_PREF_SIZE);
  }

  /** What is wrong with a place; stands outside the grid, where it moves nothing. */
  Label problem() {
    return problem;
  }

  private void heads() {
    String[] heads = {
      texts.say("frets.fret"),
      texts.say("frets.from-nut"),
      texts.say("frets.from-before"),
      texts.say("frets.to-last"),
      texts.say("frets.measured"),
      texts.say("frets.off"),
      texts.say("frets.cents"),
      texts.say("frets.bar")
    };
    for (int column = 0; column < heads.length; column++) {
      Label head = new Label(heads[column]);
      head.getStyleClass().add(Looks.NOTE);
      head.setMinWidth(Region.USE_PREF_SIZE);
      add(head, column, 0);
      if (column == BAR) {
        head.setMaxWidth(Double.MAX_VALUE);
        head.getStyleClass().add("bar-head");
      }
    }
  }

  private void line(int fret, Runnable changed) {
    Line line =
        new Line(
            FigureLabels.strong(Integer.toString(fret)),
            FigureLabels.plain(),
            FigureLabels.soft(),
            FigureLabels.soft(),
            field(fret, changed),
            FigureLabels.plain(),
            FigureLabels.strong(""),
            new CostBar());
    lines.add(line);
    for (int column = 0; column <= BAR; column++) {
      add(line.all().get(column), column, fret);
    }
    setFillWidth(line.bar(), true);
  }

  private TextField field(int fret, Runnable changed) {
    TypedFieldModel<Length> place = model.place(fret);
    TextField field = TypedCell.of(place);
    field.setId("fret-" + fret);
    field.getStyleClass().addAll(Looks.FIGURE, "fret-field");
    field.setAccessibleText(texts.say("frets.field", Integer.toString(fret)));
    place.typedProperty().addListener((property, before, now) -> changed.run());
    place.problemProperty().addListener((property, before, now) -> sayProblem());
    field.addEventFilter(KeyEvent.KEY_PRESSED, key -> walk(key, fret));
    return field;
  }

  /** Enter and the arrows go from fret to fret. */
  private void walk(KeyEvent key, int fret) {
    boolean down = key.getCode() == KeyCode.ENTER || key.getCode() == KeyCode.DOWN;
    boolean up = key.getCode() == KeyCode.UP;
    if (key.isShortcutDown() || !(down || up)) {
      return;
    }
    int next = down ? fret + 1 : fret - 1;
    if (next >= 1 && next <= lines.size() && lines.get(next - 1).field().isVisible()) {
      lines.get(next - 1).field().requestFocus();
    }
    key.consume();
  }

  private void sayProblem() {
    String said = "";
    for (int fret = FretSheetModel.MOST_FRETS; fret >= 1; fret--) {
      var wrong = model.place(fret).problemProperty().get();
      if (wrong.isPresent()) {
        said = texts.say("frets.problem", Integer.toString(fret), texts.say(wrong.get()));
      }
    }
    problem.setText(said.replace('\n', ' '));
    problem.setVisible(!said.isEmpty());
    problem.setManaged(!said.isEmpty());
  }

  /** Puts the focus on the first place that cannot be taken; on fret 1 where all can. */
  void focusProblem() {
    for (Line line : lines) {
      if (line.field().getPseudoClassStates().contains(Looks.ERROR)) {
        line.field().requestFocus();
        return;
      }
    }
    focus();
  }

  void focus() {
    lines.get(0).field().requestFocus();
  }

  /** Shows the model; the lines beyond the last fret are put away. */
  void show(boolean tight) {
    List<FretRow> rows = model.rows();
    Optional<FretRow> worst = model.worst();
    for (int i = 0; i < lines.size(); i++) {
      Line line = lines.get(i);
      boolean there = i < rows.size();
      for (Region part : line.all()) {
        part.setVisible(there);
        part.setManaged(there);
      }
      if (there) {
        show(line, rows.get(i), worst);
      }
    }
    getChildren()
        .forEach(
            node -> {
              Integer column = getColumnIndex(node);
              Integer row = getRowIndex(node);
              boolean spare = column == TO_LAST || column == 2;
              if (spare && (row == 0 || row <= rows.size())) {
                node.setVisible(!tight);
                node.setManaged(!tight);
              }
            });
    sayProblem();
  }

  private void show(Line line, FretRow row, Optional<FretRow> worst) {
    line.fromNut().setText(length(row.fromNutMm()));
    line.before().setText(length(row.fromBeforeMm()));
    line.toLast().setText(length(row.toLastMm()));
    line.off().setText(row.off().map(off -> signed(off.mm())).orElse(""));
    line.cents().setText(row.off().map(off -> Figures.signed(off.cents(), 1)).orElse(""));
    line.bar()
        .show(row.off().map(off -> OptionalDouble.of(off.cents())).orElse(OptionalDouble.empty()));
    boolean costly = worst.filter(one -> one.fret() == row.fret()).isPresent() && costs(row);
    line.cents().getStyleClass().setAll("label");
    if (costly) {
      line.cents().getStyleClass().add(Looks.STRONG);
    }
  }

  private static boolean costs(FretRow row) {
    return row.off().map(off -> Math.abs(off.cents()) >= 0.5).orElse(false);
  }

  private String length(double mm) {
    return unit == LengthUnit.MM
        ? Figures.fixed(mm, 2)
        : Figures.fixed(mm / LengthUnit.MM_PER_INCH, 4);
  }

  private String signed(double mm) {
    return unit == LengthUnit.MM
        ? Figures.signed(mm, 2)
        : Figures.signed(mm / LengthUnit.MM_PER_INCH, 4);
  }

  /** Labels that hold a figure. */
  private static final class FigureLabels {
    private FigureLabels() {}

    static Label plain() {
      Label label = new Label();
      label.setMinWidth(Region.USE_PREF_SIZE);
      return label;
    }

    static Label soft() {
      Label label = plain();
      label.getStyleClass().add(Looks.SOFT);
      return label;
    }

    static Label strong(String text) {
      Label label = plain();
      label.setText(text);
      label.getStyleClass().add(Looks.STRONG);
      return label;
    }
  }
}
