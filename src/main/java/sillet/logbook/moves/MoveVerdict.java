package sillet.logbook.moves;

/** What to do with the figures of a move. */
final class MoveVerdict {
  private MoveVerdict() {}

  /**
   * Leave it when zero lies in the interval or the reading was not typed finely enough to tell;
   * otherwise it must fit into the travel.
   */
  static Verdict of(BenchString string, MoveFigures figures) {
    boolean zeroInside = figures.lowMm() <= 0 && figures.highMm() >= 0;
    return zeroInside || belowTypedStep(string, figures)
        ? Verdict.LEAVE
        : fitting(string.room(), figures);
  }

  /** Move it, if it fits into the travel. */
  static Verdict fitting(SaddleRoom room, MoveFigures figures) {
    Double left = room.toward(figures.saddleMm());
    if (left != null && Math.abs(figures.saddleMm()) > left) {
      return room.onePiece() ? Verdict.SLOT : Verdict.NO_ROOM;
    }
    return Verdict.MOVE;
  }

  /** Half a step of the last typed digit, carried to the saddle. */
  private static boolean belowTypedStep(BenchString string, MoveFigures figures) {
    var twelve = string.readings().frets().get(12);
    if (twelve == null) {
      return false;
    }
    double halfStepCents = twelve.roundingSd() * Math.sqrt(12) / 2;
    return Math.abs(figures.saddleMm() * figures.centsPerMm()) < halfStepCents;
  }
}
