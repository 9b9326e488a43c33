package sillet.desktop.drawing.strings;

import sillet.desktop.drawing.Balloon;
import sillet.desktop.drawing.Box;

/**
 * Where a finding's balloon stands and where its leader begins, in px. Above the bar where the row
 * has room, else behind the cell; one of a whole fret stands under the fret's number, one of a
 * string on the string, where the drawing is broken. Holds no JavaFX types.
 *
 * @param fromX begin of the leader
 * @param fromY begin of the leader
 * @param x middle of the balloon
 * @param y middle of the balloon
 */
record FindingLeader(double fromX, double fromY, double x, double y) {
  private static final double ASIDE_EM = 1.93;
  private static final double OVER_CELL_EM = 0.79;
  private static final double BEHIND_EM = 1.5;
  private static final double ROOM_EM = 1.42;

  static FindingLeader of(SheetGeometry sheet, FindingMark finding) {
    if (finding.row() == FindingMark.ALL_STRINGS) {
      double top = sheet.rows().top();
      double x = sheet.strip().neckFretXAt(finding.fret(), top);
      double bottom = sheet.rows().bottom();
      double foot = sheet.strip().neckFretXAt(finding.fret(), bottom);
      return new FindingLeader(foot, bottom, x, top);
    }
    double y = sheet.rows().y(finding.row());
    if (finding.fret() == FindingMark.ON_STRING) {
      double broken = (sheet.breakNearX() + sheet.breakFarX()) / 2;
      return new FindingLeader(broken, y, broken, y);
    }
    if (finding.fret() == FindingMark.AT_SADDLE) {
      return atSaddle(sheet, finding.row(), y);
    }
    if (finding.fret() == 0 && sheet.measures().tight()) {
      double nut = sheet.strip().fretX(finding.row(), 0) + sheet.away() * sheet.em() / 2;
      return new FindingLeader(nut, y, nut, y);
    }
    StringRow string = sheet.picture().rows().get(finding.row());
    int neckFret = finding.fret() + string.startFret();
    double x = sheet.strip().neckFretX(finding.row(), neckFret);
    double em = sheet.em();
    boolean roomAbove = sheet.rows().rowPx() - sheet.cells().heightPx() >= ROOM_EM * em;
    boolean besideCell = sheet.picture().board().readFrets().contains(neckFret) && !sheet.column();
    if (roomAbove || !besideCell) {
      double fromY = y - Math.min(1.2, Math.max(0.5, barTop(sheet, string, finding.fret()))) * em;
      double up = sheet.cells().heightPx() / 2 + OVER_CELL_EM * em;
      return new FindingLeader(x, fromY, x + sheet.away() * ASIDE_EM * em, y - up);
    }
    Box cell = sheet.cells().cell(finding.row(), neckFret);
    double edge = sheet.away() > 0 ? cell.right() : cell.x();
    return new FindingLeader(edge, y, edge + sheet.away() * BEHIND_EM * em, y);
  }

  private static double barTop(SheetGeometry sheet, StringRow string, int fret) {
    return string.frets().stream()
        .filter(mark -> mark.fret() == fret && mark.cents() != null)
        .mapToDouble(mark -> mark.cents() * sheet.measures().cent())
        .findFirst()
        .orElse(0);
  }

  private static FindingLeader atSaddle(SheetGeometry sheet, int row, double y) {
    SaddleMark saddle = sheet.picture().rows().get(row).saddle();
    double em = sheet.em();
    double side = sheet.away();
    double x = sheet.stringEndX() - side * 2 * em;
    if (saddle != null) {
      Double wanted = saddle.targetMm();
      x = sheet.plan().x(wanted == null ? saddle.nowMm() : wanted);
    }
    double last = sheet.stringEndX() - side * Balloon.RADIUS_EM * em;
    double balloon = x + side * 1.3 * em;
    double held = side * (balloon - last) > 0 ? last : balloon;
    double up = sheet.measures().block() / 3 * em;
    return new FindingLeader(x, y - up, held, y - up - 1.36 * em);
  }

  /** The leader ends at the balloon's ring. */
  double toX(double em) {
    return x - (x - fromX) * ringShare(em);
  }

  double toY(double em) {
    return y - (y - fromY) * ringShare(em);
  }

  private double ringShare(double em) {
    double length = Math.hypot(x - fromX, y - fromY);
    return length == 0 ? 0 : Math.min(1, Balloon.RADIUS_EM * em / length);
  }
}
