package sillet.desktop.drawing.strings;

import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import sillet.desktop.drawing.Drawn;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Snap;
import sillet.desktop.theme.Looks;

/** Heads over the columns of words: what stands in them, said once. */
public final class WordsHead extends Region {
  private static final double MM_RIGHT_EM = 3.3;

  private final Label first = new Label();
  private final Label middle = new Label();
  private final Label last = new Label();
  private final EmProbe probe = new EmProbe();
  private final WordColumns columns;

  /**
   * Heads for the columns of a sheet; blank for none.
   *
   * @param figures over the turns
   * @param mm over the millimetres, where words stand on one line
   * @param left over what is at the right
   */
  public WordsHead(String figures, String mm, String left, WordColumns columns) {
    this.columns = columns;
    first.setText(figures);
    middle.setText(mm);
    last.setText(left);
    for (Label label : new Label[] {first, middle, last}) {
      label.getStyleClass().add(Looks.NOTE);
      label.setMinWidth(USE_PREF_SIZE);
    }
    getChildren().addAll(probe, first, middle, last);
  }

  @Override
  protected void layoutChildren() {
    double em = probe.em();
    first.autosize();
    middle.autosize();
    last.autosize();
    boolean oneLine = columns.line() == WordColumns.Line.ONE;
    double right = em * columns.figureRight();
    put(first, oneLine ? Math.max(0, right - first.getWidth()) : 0);
    put(middle, getWidth() - em * MM_RIGHT_EM - middle.getWidth());
    put(last, getWidth() - last.getWidth());
  }

  private void put(Label label, double x) {
    label.relocate(Snap.px(x), Snap.px((getHeight() - label.getHeight()) / 2));
  }

  /** Knows the em and draws nothing. */
  private static final class EmProbe extends Drawn {
    @Override
    protected void draw(Pen pen, double width, double height) {}
  }
}
