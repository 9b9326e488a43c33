package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/** The best move of each string of an instrument, whatever its nut can do. */
final class InstrumentMoves {
  private final KnownNeck neck;
  private final Aim aim;

  InstrumentMoves(KnownNeck neck, AimChoice aim) {
    this.neck = neck;
    this.aim = aim.acoustic();
  }

  /** One a string, in order, or why there is none. */
  List<Outcome<MoveEstimate>> solve() {
    NeckEstimate estimate = neck.estimate();
    boolean whole = anyNut(NutMovable.WHOLE);
    List<Outcome<MoveEstimate>> fixed =
        whole || estimate == null ? List.of() : all(estimate, NutFreedom.FIXED);
    List<Outcome<MoveEstimate>> free =
        estimate == null || !(whole || anyNut(NutMovable.EACH))
            ? fixed
            : all(estimate, whole ? NutFreedom.WHOLE : NutFreedom.EACH);
    List<Outcome<MoveEstimate>> result = new ArrayList<>();
    for (int i = 0; i < neck.strings().size(); i++) {
      int place = neck.place(i);
      boolean stays = !whole && nut(i) == NutMovable.NO;
      result.add(
          place < 0 ? Outcome.notSolved(neck.because(i)) : (stays ? fixed : free).get(place));
    }
    return result;
  }

  private boolean anyNut(NutMovable asked) {
    return neck.strings().stream().anyMatch(one -> one.now().room().nut() == asked);
  }

  private NutMovable nut(int index) {
    return neck.strings().get(index).now().room().nut();
  }

  private List<Outcome<MoveEstimate>> all(NeckEstimate estimate, NutFreedom nut) {
    Outcome<List<MoveEstimate>> together = MoveSolver.solve(estimate, aim, nut);
    if (together instanceof Solved<List<MoveEstimate>> solved) {
      return solved.value().stream().map(Outcome::solved).toList();
    }
    return estimate.strings() == 1
        ? List.of(Outcome.notSolved(((NotSolved<List<MoveEstimate>>) together).because()))
        : oneByOne(nut == NutFreedom.WHOLE ? NutFreedom.FIXED : nut);
  }

  /** Where one string stops the others, each stands for itself. */
  private List<Outcome<MoveEstimate>> oneByOne(NutFreedom nut) {
    List<Outcome<MoveEstimate>> result = new ArrayList<>();
    for (int i = 0; i < neck.strings().size(); i++) {
      if (neck.place(i) >= 0) {
        NeckEstimate alone = KnownNeck.of(List.of(neck.strings().get(i))).estimate();
        result.add(
            alone == null
                ? Outcome.notSolved(neck.because(i))
                : MoveSolver.solve(alone, aim, nut).map(moves -> moves.get(0)));
      }
    }
    return result;
  }
}
