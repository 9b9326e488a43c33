package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.SaddleTop;
import sillet.acoustics.moves.StraightSaddle;
import sillet.acoustics.moves.StraightSaddleMove;
import sillet.acoustics.solve.Solved;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.text.Message;

/** What a saddle or bridge in one piece can do for all strings together. */
final class StraightBridge {
  private static final double MM_PER_M = 1 / AcousticString.M_PER_MM;

  private final KnownNeck neck;
  private final NeckEstimate estimate;
  private final List<MoveAdvice> advice;

  private StraightBridge(KnownNeck neck, NeckEstimate estimate, List<MoveAdvice> advice) {
    this.neck = neck;
    this.estimate = estimate;
    this.advice = advice;
  }

  /** The advice; null where strings have saddles of their own, or there is no estimate. */
  static @Nullable BridgeAdvice of(KnownNeck neck, List<MoveAdvice> advice, AimChoice aim) {
    NeckEstimate estimate = neck.estimate();
    boolean straight =
        neck.strings().stream()
            .map(string -> string.now().room().kind())
            .allMatch(kind -> kind == SaddleKind.ONE_PIECE || kind == SaddleKind.FLOATING);
    if (estimate == null || !straight) {
      return null;
    }
    return StraightSaddle.solve(estimate, aim.acoustic())
            instanceof Solved<StraightSaddleMove> solved
        ? new StraightBridge(neck, estimate, advice).advice(solved.value())
        : null;
  }

  private BridgeAdvice advice(StraightSaddleMove line) {
    List<BridgeAdvice.StringLeft> left = new ArrayList<>();
    for (int i = 0; i < neck.strings().size(); i++) {
      if (neck.place(i) >= 0 && neck.place(i) < estimate.strings()) {
        left.add(left(neck.strings().get(i).now(), line.strings().get(neck.place(i)), i));
      }
    }
    boolean floating =
        neck.strings().stream().anyMatch(s -> s.now().room().kind() == SaddleKind.FLOATING);
    return new BridgeAdvice(
        line.first() * MM_PER_M,
        line.last() * MM_PER_M,
        left,
        List.of(Message.of(floating ? "bridge.floating" : "bridge.one-piece")));
  }

  private BridgeAdvice.StringLeft left(BenchString string, MoveEstimate onLine, int index) {
    MoveFigures own = advice.get(index).figures();
    Double forwardMm = string.room().forwardMm();
    Double thicknessMm = string.room().thicknessMm();
    // what is left of a fixed saddle in front is how far its break point stands from that edge
    Double fromFrontMm =
        (own == null || forwardMm == null || !string.room().onePiece())
            ? null
            : Double.valueOf(forwardMm + own.saddleMm());
    Boolean fits =
        (fromFrontMm == null || thicknessMm == null) ? null : holds(thicknessMm, fromFrontMm);
    return new BridgeAdvice.StringLeft(
        string.string().number(), onLine.cents12After(), onLine.rmsAfter(), fromFrontMm, fits);
  }

  private static boolean holds(double thicknessMm, double fromFrontMm) {
    double thickness = thicknessMm * AcousticString.M_PER_MM;
    return thickness > 2 * SaddleTop.USUAL_EDGE
        && new SaddleTop(thickness, SaddleTop.USUAL_EDGE)
            .holds(fromFrontMm * AcousticString.M_PER_MM);
  }
}
