package sillet.desktop.visit.picture;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.strings.SaddleMark;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.moves.Verdict;
import sillet.logbook.visits.MoveProof;
import sillet.logbook.visits.StringPass;

/** The saddle of each string as it is drawn in a pass. */
final class SaddleMarks {
  private final List<List<StringPass>> passes;
  private final int pass;
  private final boolean fromFrontEdge;

  /**
   * The saddles of a pass.
   *
   * @param passes every pass
   * @param pass the one that is looked at, from 1
   * @param fromFrontEdge of a one-piece saddle, in place of the nominal scale line
   */
  SaddleMarks(List<List<StringPass>> passes, int pass, boolean fromFrontEdge) {
    this.passes = passes;
    this.pass = pass;
    this.fromFrontEdge = fromFrontEdge;
  }

  /** The mark of a row; null where it is not known where the saddle stands. */
  @Nullable SaddleMark of(int row) {
    StringPass string = passes.get(pass - 1).get(row);
    Double now = now(row, string);
    if (now == null) {
      return null;
    }
    SaddleRoom room = string.string().room();
    Double forward = room.forwardMm();
    Double back = room.backMm();
    Double toward = forward == null ? null : Double.valueOf(now - forward);
    Double away = back == null ? null : Double.valueOf(now + back);
    SaddleMark mark = new SaddleMark(now, null, null, null, before(row, now), toward, away);
    return withTarget(mark, string, now);
  }

  private @Nullable Double now(int row, StringPass string) {
    if (!fromFrontEdge) {
      return SaddlePlaces.mm(passes, row, pass);
    }
    Double forward = string.string().room().forwardMm();
    return forward == null ? null : Double.valueOf(forward + OnePieceEdge.KEPT_MM);
  }

  private @Nullable Double before(int row, double now) {
    Double made = pass > 1 ? passes.get(pass - 2).get(row).madeMm() : null;
    return made == null ? null : Double.valueOf(now - made);
  }

  private SaddleMark withTarget(SaddleMark mark, StringPass string, double now) {
    MoveAdvice advice = string.advice();
    MoveFigures figures = SaddlePlaces.figures(string);
    MoveProof proof = string.proof();
    boolean done = proof != null && proof.withinOneCent();
    if (advice == null || figures == null || done || string.madeMm() != null) {
      return mark;
    }
    double low = now + figures.lowMm();
    double high = now + figures.highMm();
    return advice.verdict() == Verdict.LEAVE
        ? mark.leave(low, high)
        : mark.to(now + figures.saddleMm(), low, high);
  }
}
