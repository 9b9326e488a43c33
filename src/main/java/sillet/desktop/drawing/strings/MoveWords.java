package sillet.desktop.drawing.strings;

import java.util.List;
import java.util.Locale;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import sillet.desktop.drawing.Mark;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.drawing.Snap;
import sillet.desktop.theme.Looks;

/**
 * The words beside a string, in this order: arrow, turns, direction; below: mm, interval, travel
 * left. All rows of a sheet share their columns.
 */
public final class MoveWords extends Region {
  private static final double FIGURE_UP = 0.4;
  private static final double SMALL_DOWN = 0.5;
  private static final double MM_RIGHT_EM = 3.3;
  private static final double GAP_EM = 0.57;

  private final Mark mark;
  private final Label figure = label(Looks.MOVE_FIGURE);
  private final Label unit = label(Looks.MOVE_UNIT);
  private final Label words = label(Looks.MOVE_DIRECTION);
  private final Label mm = label(Looks.MOVE_SMALL);
  private final Label detail = label(Looks.MOVE_SMALL, Looks.SOFT);
  private final Label left = label(Looks.MOVE_SMALL, Looks.SOFT);
  private final Label at = label(Looks.MOVE_UNIT, Looks.SOFT);
  private final Label place = label(Looks.MOVE_FIGURE);

  private MoveText text;
  private WordColumns columns;

  /** Words set in the columns of their sheet. */
  public MoveWords(MoveText text, WordColumns columns) {
    this.text = text;
    this.columns = columns;
    this.mark = new Mark(text.mark(), "");
    setAccessibleRole(AccessibleRole.TEXT);
    getChildren().addAll(mark, figure, unit, words, mm, detail, left, at, place);
    show(text, columns);
  }

  private static Label label(String... looks) {
    Label label = new Label();
    label.getStyleClass().addAll(looks);
    label.setMinWidth(USE_PREF_SIZE);
    return label;
  }

  /** Shows other words. */
  public void show(MoveText newText, WordColumns newColumns) {
    text = newText;
    columns = newColumns;
    mark.show(text.mark(), "");
    figure.setText(text.figure());
    unit.setText(text.unit());
    words.setText(text.words());
    mm.setText(text.mm());
    detail.setText(text.detail());
    left.setText(text.left());
    at.setText(text.place().at());
    place.setText(text.place().figure());
    pencil(words, text.needsHand() && !text.isMove());
    pencil(detail, text.needsHand() && text.isMove());
    boolean waits = columns.line() == WordColumns.Line.ONE && text.mark() == MarkShape.NOT_YET;
    words.pseudoClassStateChanged(Looks.STANDING, waits);
    place.pseudoClassStateChanged(Looks.STANDING, !text.isMove());
    size(figure, columns.turns());
    size(place, columns.turns());
    size(words, columns.words());
    setAccessibleText(text.aloud());
    requestLayout();
  }

  private static void pencil(Label label, boolean wanted) {
    label.getStyleClass().remove(Looks.NEEDS_HAND);
    if (wanted) {
      label.getStyleClass().add(Looks.NEEDS_HAND);
    }
  }

  private static void size(Label label, double em) {
    label.setStyle(String.format(Locale.ROOT, "-fx-font-size: %.2fem;", em));
  }

  @Override
  protected void layoutChildren() {
    double middle = getHeight() / 2;
    boolean oneLine = columns.line() == WordColumns.Line.ONE;
    double up = oneLine ? middle : middle - em(FIGURE_UP * columns.turns());
    double down = oneLine ? middle : middle + em(SMALL_DOWN * columns.turns());
    List.of(mark, figure, unit, words, mm, detail, left, at, place).forEach(Region::autosize);
    mark.relocate(0, Snap.px(up - mark.getHeight() / 2));
    upperLine(up);
    left.setVisible(true);
    endingAt(left, getWidth(), down);
    detail.setVisible(!oneLine);
    if (oneLine) {
      endingAt(mm, getWidth() - em(MM_RIGHT_EM), down);
    } else {
      lowerLine(down);
    }
  }

  private void upperLine(double up) {
    boolean withPlace = columns.line() == WordColumns.Line.PLACE;
    endingAt(figure, em(columns.figureRight()), up);
    beginningAt(unit, em(columns.unit()), up + em(0.1));
    double from = em(text.figure().isEmpty() ? columns.verdict() : columns.direction());
    boolean fits = from + words.getWidth() <= getWidth() + 1;
    unit.setVisible(fits && columns.unit() > columns.figureRight());
    if (!fits && !text.figure().isEmpty() && columns.unit() > columns.figureRight()) {
      from = em(columns.unit());
    }
    beginningAt(words, from, up + (withPlace ? 0 : em(0.1)));
    at.setVisible(withPlace);
    place.setVisible(withPlace);
    endingAt(place, getWidth(), up);
    endingAt(at, getWidth() - place.getWidth() - em(GAP_EM), up + em(0.18));
  }

  private void lowerLine(double down) {
    boolean underFigure = columns.line() == WordColumns.Line.TWO;
    if (underFigure && (text.isMove() || columns.verdict() == columns.direction())) {
      endingAt(mm, em(columns.figureRight()), down);
      beginningAt(detail, em(columns.detail()), down);
      return;
    }
    beginningAt(mm, em(columns.verdict()), down);
    double behind = text.mm().isEmpty() ? 0 : mm.getWidth() + em(GAP_EM);
    double column = text.isMove() && !text.mm().isEmpty() ? em(columns.detail()) : 0;
    beginningAt(detail, Math.max(column, em(columns.verdict()) + behind), down);
  }

  private double em(double count) {
    return count * mark.em();
  }

  private void beginningAt(Label label, double x, double middle) {
    label.resize(Math.max(0, Math.min(label.getWidth(), getWidth() - x)), label.getHeight());
    label.relocate(Snap.px(x), Snap.px(middle - label.getHeight() / 2));
  }

  private void endingAt(Label label, double x, double middle) {
    beginningAt(label, x - label.getWidth(), middle);
  }

  @Override
  protected double computePrefHeight(double width) {
    return em(columns.line() == WordColumns.Line.ONE ? SheetMeasures.LEAST_ROW : 3.43);
  }
}
