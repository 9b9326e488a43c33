package sillet.desktop.drawing.strings;

import java.util.List;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Snap;

/**
 * Where reading cells stand: each hangs beside its fret line on the side of the bridge, with room
 * for the bar on the line. Cells take the largest size their neighbours allow; where read frets
 * stand too close, cells move up the neck rather than overlap; where that is not enough, the cells
 * of one fret stand in a column behind the board. Holds no JavaFX types.
 */
public final class CellGrid {
  static final double HANG_EM = 0.57;
  private static final double BEFORE_NEXT_EM = 0.79;
  private static final double BETWEEN_EM = 0.29;
  private static final double HALF_MARK_EM = 0.32;
  private static final double LEAST_FIGURE_PX = 16;
  private static final double LEAST_FIGURE_EM = 1;
  private static final double FIGURE_IN_WIDTH = 3.4;
  private static final double FIGURE_IN_HEIGHT = 1.65;

  private final NeckStripGeometry strip;
  private final StringRows rows;
  private final SheetMeasures measures;
  private final Frame frame;
  private final List<Integer> readFrets;
  private final double widthPx;
  private final boolean column;

  /**
   * What the grid keeps to.
   *
   * @param em px of one em
   * @param endX px the last cell may reach to
   * @param away 1 where the bridge lies to the right, else -1
   */
  public record Frame(double em, double endX, int away) {}

  /** A grid for the read frets of a board. */
  public CellGrid(
      StringsPicture picture,
      NeckStripGeometry strip,
      StringRows rows,
      SheetMeasures measures,
      Frame frame) {
    this.strip = strip;
    this.rows = rows;
    this.measures = measures;
    this.frame = frame;
    this.readFrets = picture.board().readFrets();
    this.column = picture.board().column() != null;
    this.widthPx = Math.floor(column ? columnPx(measures, frame.em()) : widestThatFits());
  }

  /** A cell whose figures can be read at arm's length. */
  static double leastWidthPx(double em) {
    return FIGURE_IN_WIDTH * Math.max(LEAST_FIGURE_PX, LEAST_FIGURE_EM * em);
  }

  /** Width of the one column of cells behind the board. */
  static double columnPx(SheetMeasures measures, double em) {
    return Math.max(measures.widestCell() * em, leastWidthPx(em));
  }

  private double widestThatFits() {
    double widest = frame.em() * measures.widestCell();
    for (int row = 0; row < rows.count(); row++) {
      widest = Math.min(widest, widestInRow(row));
    }
    double all = towardBridge(frame.endX()) - lineX(0, 0);
    double most = readFrets.isEmpty() ? widest : all / readFrets.size() - frame.em() * BETWEEN_EM;
    return Math.min(most, Math.max(widest, leastWidthPx(frame.em())));
  }

  private double widestInRow(int row) {
    double widest = Double.POSITIVE_INFINITY;
    for (int i = 0; i < readFrets.size(); i++) {
      double from = lineX(row, readFrets.get(i)) + frame.em() * HANG_EM;
      boolean last = i == readFrets.size() - 1;
      double to =
          last
              ? towardBridge(frame.endX())
              : lineX(row, readFrets.get(i + 1)) - frame.em() * BEFORE_NEXT_EM;
      widest = Math.min(widest, to - from);
    }
    return widest;
  }

  /** Px growing toward the bridge, so that mirrored strips reckon alike. */
  private double towardBridge(double x) {
    return frame.away() * x;
  }

  private double lineX(int row, int neckFret) {
    return towardBridge(strip.neckFretX(row, neckFret));
  }

  /** Whether cells have room beside every read fret and none hides the mark of the next. */
  boolean fit() {
    if (column || widthPx < leastWidthPx(frame.em())) {
      return column;
    }
    double mark = frame.em() * HALF_MARK_EM;
    for (int row = 0; row < rows.count(); row++) {
      double[] edges = nearEdges(row);
      for (int i = 0; i + 1 < edges.length; i++) {
        if (edges[i] + widthPx > lineX(row, readFrets.get(i + 1)) - mark) {
          return false;
        }
      }
    }
    return true;
  }

  /** Width of every cell in px. */
  public double widthPx() {
    return widthPx;
  }

  /** Height of every cell in px. */
  public double heightPx() {
    return Snap.odd(frame.em() * measures.cellHeight());
  }

  /** Type size of a cell's figure in px. */
  public double figurePx() {
    double fits = Math.min(widthPx / FIGURE_IN_WIDTH, heightPx() / FIGURE_IN_HEIGHT);
    return Math.min(frame.em() * measures.figure(), fits);
  }

  /** The cell of one string at one read fret of the neck. */
  public Box cell(int row, int neckFret) {
    int place = readFrets.indexOf(neckFret);
    if (place < 0 && !column) {
      throw new IllegalArgumentException("No cells at fret " + neckFret + ", only at " + readFrets);
    }
    double near = Snap.px(column ? towardBridge(frame.endX()) - widthPx : nearEdges(row)[place]);
    double left = frame.away() > 0 ? near : -near - widthPx;
    double height = heightPx();
    return new Box(left, Snap.px(rows.y(row) - height / 2), widthPx, height);
  }

  private double[] nearEdges(int row) {
    double[] edges = new double[readFrets.size()];
    double free = Double.NEGATIVE_INFINITY;
    double step = widthPx + frame.em() * BETWEEN_EM;
    for (int i = 0; i < edges.length; i++) {
      edges[i] = Math.max(free, lineX(row, readFrets.get(i)) + frame.em() * HANG_EM);
      free = edges[i] + step;
    }
    double limit = towardBridge(frame.endX()) - widthPx;
    for (int i = edges.length - 1; i >= 0; i--) {
      edges[i] = Math.min(edges[i], limit);
      limit = edges[i] - step;
    }
    return edges;
  }
}
