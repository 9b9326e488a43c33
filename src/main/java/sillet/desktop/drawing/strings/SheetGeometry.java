package sillet.desktop.drawing.strings;

import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Snap;

/**
 * The whole sheet laid out: names, strip, break line, bridge plan and words, in px. Left-handed
 * sheets are the same with left and right exchanged. Holds no JavaFX types.
 */
public final class SheetGeometry {
  static final double NUT_EM = 0.36;

  private static final double HEAD_EM = 2.2;
  private static final double HEAD_LINE_EM = 1.36;
  private static final double FOOT_EM = 2.9;
  private static final double RULE_EM = 1;
  private static final double WORDS_GAP_EM = 1;
  private static final double BOARD_BEYOND_FRET_EM = 0.36;
  private static final double BEFORE_BREAK_EM = 0.29;
  private static final double ONE_PIECE_MARGIN_EM = 1.86;
  private static final double MM_PER_INCH = 25.4;

  private final StringsPicture picture;
  private final SheetMeasures measures;
  private final Frame frame;
  private final StringRows rows;
  private final NeckStripGeometry strip;
  private final CellGrid cells;
  private final BridgePlanGeometry plan;

  /**
   * The room for a sheet.
   *
   * @param widthPx whole width
   * @param em px of one em
   * @param dotsPerInch px of an inch on this screen
   */
  public record Frame(double widthPx, double em, double dotsPerInch) {}

  /** Lays a picture out. */
  public SheetGeometry(StringsPicture picture, SheetMeasures measures, Frame frame) {
    this.picture = picture;
    this.measures = measures;
    this.frame = frame;
    this.rows = new StringRows(picture, measures, Snap.px(em(HEAD_EM)), frame.em());
    this.strip = new NeckStripGeometry(picture, rows, zeroX(), lastFretX());
    this.cells =
        new CellGrid(
            picture,
            strip,
            rows,
            measures,
            new CellGrid.Frame(
                frame.em(), fromNutSide(firstBreak() - em(BEFORE_BREAK_EM)), picture.lie().away()));
    this.plan = new BridgePlanGeometry(picture, planFrame());
  }

  /** Height of a sheet in px when one em is so many px. */
  public static double heightPx(StringsPicture picture, SheetMeasures measures, double em) {
    StringRows rows = new StringRows(picture, measures, Snap.px(HEAD_EM * em), em);
    return Math.ceil(rows.bottom() + FOOT_EM * em);
  }

  private double em(double count) {
    return count * frame.em();
  }

  /** A place so many px from the side where the nut lies. */
  private double fromNutSide(double px) {
    return picture.lie().bridgeLeft() ? frame.widthPx() - px : px;
  }

  private double regionEnd() {
    return frame.widthPx() - em(measures.words() + WORDS_GAP_EM);
  }

  private double secondBreak() {
    return regionEnd() - em(measures.bridge());
  }

  private double firstBreak() {
    return secondBreak() - em(measures.gaps().breakLines());
  }

  private double zeroX() {
    return fromNutSide(em(measures.names() + NUT_EM));
  }

  /** The last fret stands before the break line, and the last cell too has its room there. */
  private double lastFretX() {
    double zero = em(measures.names() + NUT_EM);
    double room = firstBreak() - em(measures.gaps().boardToBreak() + BOARD_BEYOND_FRET_EM) - zero;
    if (column()) {
      return fromNutSide(zero + room - CellGrid.columnPx(measures, frame.em()));
    }
    double cell = em(CellGrid.HANG_EM) + CellGrid.leastWidthPx(frame.em());
    double roomForCell = firstBreak() - em(BEFORE_BREAK_EM) - cell - zero;
    double share = NeckStripGeometry.shareOfLastReadFret(picture);
    double length = share > 0 ? Math.min(room, roomForCell / share) : room;
    return fromNutSide(zero + length);
  }

  private BridgePlanGeometry.Frame planFrame() {
    double from = measures.gaps().breakToPlan() + measures.gaps().inPlan();
    double to = measures.gaps().planToEnd() + measures.gaps().inPlan();
    double margin = measures.gaps().inPlan();
    if (picture.isOnePiece()) {
      from = ONE_PIECE_MARGIN_EM;
      to = ONE_PIECE_MARGIN_EM;
      margin = ONE_PIECE_MARGIN_EM - BEFORE_BREAK_EM;
    }
    return new BridgePlanGeometry.Frame(
        fromNutSide(secondBreak() + em(from)),
        fromNutSide(regionEnd() - em(to)),
        em(margin),
        frame.dotsPerInch(),
        measures.along());
  }

  /** Whether the cells of one fret stand behind the board. */
  boolean column() {
    return picture.board().column() != null;
  }

  /** The column of string names, beside the nut. */
  public Box names() {
    double width = em(measures.names());
    return new Box(picture.lie().bridgeLeft() ? frame.widthPx() - width : 0, 0, width, height());
  }

  /** The nut: its edge toward the bridge is the zero of the strip. */
  double nutOuterX() {
    return fromNutSide(em(measures.names()));
  }

  /** End of the board beyond the last fret. */
  double boardEnd() {
    return strip.x(strip.lengthMm()) + away() * em(BOARD_BEYOND_FRET_EM);
  }

  /** The break line on the side of the neck. */
  double breakNearX() {
    return fromNutSide(firstBreak());
  }

  /** The break line on the side of the bridge. */
  double breakFarX() {
    return fromNutSide(secondBreak());
  }

  /** Where the strings end behind the bridge. */
  double stringEndX() {
    return fromNutSide(regionEnd());
  }

  /** The outline of the bridge, or of a one-piece saddle. */
  Box bridgeOutline() {
    double from = fromNutSide(secondBreak() + em(measures.gaps().breakToPlan()));
    double to = fromNutSide(regionEnd() - em(measures.gaps().planToEnd()));
    if (picture.isOnePiece()) {
      from = plan.x(plan.lowMm());
      to = plan.x(plan.highMm());
    }
    return new Box(Math.min(from, to), rows.top(), Math.abs(to - from), rows.bottom() - rows.top());
  }

  /** Where the words of a row stand. */
  public Box words(int row) {
    double width = em(measures.words());
    double x = picture.lie().bridgeLeft() ? 0 : frame.widthPx() - width;
    return new Box(
        Snap.px(x),
        Snap.px(rows.y(row) - rows.rowPx() / 2),
        Math.floor(width),
        Math.floor(rows.rowPx()));
  }

  /** The line of heads above the words. */
  public Box wordsHead() {
    Box first = words(rows.uppermost());
    double height = em(1.71);
    return new Box(first.x(), headLineY() - height / 2, first.width(), height);
  }

  /** The line on which fret numbers stand. */
  public double headLineY() {
    return rows.top() - em(HEAD_LINE_EM);
  }

  /** The line of both rules. */
  double ruleY() {
    return rows.bottom() + em(RULE_EM);
  }

  /** Height of the whole sheet. */
  public double height() {
    return Math.ceil(rows.bottom() + em(FOOT_EM));
  }

  /** Scale of the plan across the strings, times life size; NaN where the spread is not known. */
  public double across() {
    if (picture.spreadMm().isEmpty() || rows.count() < 2) {
      return Double.NaN;
    }
    double px = Math.abs(rows.y(rows.count() - 1) - rows.y(0));
    return px * MM_PER_INCH / frame.dotsPerInch() / picture.spreadMm().getAsDouble();
  }

  public StringsPicture picture() {
    return picture;
  }

  public SheetMeasures measures() {
    return measures;
  }

  public StringRows rows() {
    return rows;
  }

  public NeckStripGeometry strip() {
    return strip;
  }

  public CellGrid cells() {
    return cells;
  }

  public BridgePlanGeometry plan() {
    return plan;
  }

  /** Px of one em. */
  public double em() {
    return frame.em();
  }

  /** 1 where "away from the neck" points right, else -1. */
  public int away() {
    return picture.lie().away();
  }
}
