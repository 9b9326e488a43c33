package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.solve.Solved;

/**
 * One string's figures for people, out of the estimate of its instrument: metres into millimetres.
 */
final class AdviceFigures {
  private static final double MM_PER_M = 1 / AcousticString.M_PER_MM;
  private static final int OCTAVE = 12;
  private static final int LAST_FRET = 24;

  private final NeckEstimate estimate;
  private final int place;
  private final BenchString string;

  AdviceFigures(NeckEstimate estimate, int place, BenchString string) {
    this.estimate = estimate;
    this.place = place;
    this.string = string;
  }

  MoveFigures of(MoveEstimate move) {
    Double screw = string.room().screwMm();
    double saddleMm = move.saddleMove() * MM_PER_M;
    // with earlier passes the estimate is not the last reading alone; people compare with the tuner
    NoteRead read = string.readings().at(OCTAVE);
    return new MoveFigures(
        saddleMm,
        move.saddleLow() * MM_PER_M,
        move.saddleHigh() * MM_PER_M,
        screw == null ? null : Math.abs(saddleMm) / screw,
        string.room().nut() == NutMovable.NO ? null : move.nutMove() * MM_PER_M,
        read == null ? move.cents12Before() : read.cents(),
        read == null ? move.cents12Sd() : read.sdCents(),
        move.cents12After(),
        move.rmsBefore(),
        move.rmsAfter(),
        move.centsPerMetre() / MM_PER_M,
        move.setbackNow() * MM_PER_M);
  }

  /** Every note now and after a move; empty where the moved string has none. */
  List<FretCents> neck(MoveEstimate move) {
    StringSituation now = estimate.situation(place);
    FrettedPitch before = pitch(now, now.lie());
    FrettedPitch after =
        pitch(
            now,
            now.lie()
                .withSaddleSetback(now.lie().saddleSetback() + move.saddleMove())
                .withNutSetback(now.lie().nutSetback() - move.nutMove()));
    List<FretCents> frets = new ArrayList<>();
    if (before == null || after == null) {
      return frets;
    }
    for (int fret = 1; fret <= Math.min(LAST_FRET, NeckEstimate.LAST_FRET); fret++) {
      Figure cents = estimate.cents(place, fret);
      boolean read = string.readings().frets().containsKey(fret);
      double change = after.centsAgainstOpen(fret) - before.centsAgainstOpen(fret);
      frets.add(new FretCents(fret, cents.value(), cents.sd(), read, cents.value() + change));
    }
    return frets;
  }

  private static @Nullable FrettedPitch pitch(StringSituation now, StringLie lie) {
    return FrettedPitch.of(lie, now.fretting()) instanceof Solved<FrettedPitch> solved
        ? solved.value()
        : null;
  }

  /**
   * What stays at fret 12 when the saddle goes to the end of its travel, cents; null where it fits
   * or is not known.
   */
  @Nullable Double centsLeft(MoveFigures figures) {
    Double room = string.room().toward(figures.saddleMm());
    if (room == null || Math.abs(figures.saddleMm()) <= room) {
      return null;
    }
    double possible = Math.copySign(room, figures.saddleMm()) / MM_PER_M;
    return MoveSolver.cents12At(estimate, place, possible) instanceof Solved<Double> solved
        ? solved.value()
        : null;
  }
}
