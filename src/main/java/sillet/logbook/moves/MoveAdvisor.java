package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.MoveTask;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.logbook.text.Message;

/** Tells for each string of an instrument how far its saddle goes, and what a saddle cannot do. */
public final class MoveAdvisor {
  private static final double MM_PER_M = 1e3;

  private final double breakingShare;

  /**
   * An advisor with the shop's own limit.
   *
   * @param breakingSharePercent a string tuned beyond this share of its breaking tension is
   *     flagged, percent
   */
  public MoveAdvisor(double breakingSharePercent) {
    this.breakingShare = breakingSharePercent / 100;
  }

  /**
   * Advises on the strings of one instrument together.
   *
   * @param strings all of the same instrument, each with at least one reading
   * @param aim what shall become true
   * @return one advice for each string, in the same order, and what concerns all; figures that
   *     cannot be solved are missing and say why
   */
  public InstrumentAdvice advise(List<BenchString> strings, AimChoice aim) {
    List<MoveAdvice> advice =
        each(strings, aim.kind() == AimChoice.Kind.OCTAVE ? Aim.OCTAVE : Aim.NECK);
    List<FindingReport> findings =
        advice.stream().flatMap(one -> one.findings().stream()).distinct().toList();
    return new InstrumentAdvice(advice, findings, null);
  }

  private List<MoveAdvice> each(List<BenchString> strings, Aim aim) {
    List<MoveTask> tasks = strings.stream().map(s -> AcousticString.task(s, aim)).toList();
    boolean nutAsOne =
        aim == Aim.NECK && strings.stream().anyMatch(s -> s.room().nut() == NutMovable.WHOLE);
    if (nutAsOne) {
      return withOneNut(strings, tasks);
    }
    List<MoveAdvice> advice = new ArrayList<>(strings.size());
    for (int i = 0; i < tasks.size(); i++) {
      advice.add(advice(strings.get(i), tasks.get(i), MoveSolver.solve(tasks.get(i))));
    }
    return advice;
  }

  private List<MoveAdvice> withOneNut(List<BenchString> strings, List<MoveTask> tasks) {
    Outcome<List<MoveEstimate>> outcome = MoveSolver.solveWholeNut(tasks);
    List<MoveAdvice> advice = new ArrayList<>(strings.size());
    for (int i = 0; i < tasks.size(); i++) {
      int place = i;
      advice.add(advice(strings.get(i), tasks.get(i), outcome.map(all -> all.get(place))));
    }
    return advice;
  }

  private MoveAdvice advice(BenchString string, MoveTask task, Outcome<MoveEstimate> outcome) {
    MoveNotes notes = new MoveNotes(string);
    List<FindingReport> findings = notes.wildTries();
    Verdict verdict = Verdict.LEAVE;
    MoveFigures figures = null;
    if (outcome instanceof Solved<MoveEstimate> solved) {
      figures = figures(string, solved.value());
      verdict = verdict(string, figures);
      notes.verdict(verdict, figures, centsLeft(string, task, figures));
    } else if (outcome instanceof NotSolved<MoveEstimate> not) {
      notes.notSolved(not.because());
    }
    notes.strain(AcousticString.shareOfBreaking(string.string()), breakingShare);
    return new MoveAdvice(string, figures, verdict, List.of(), findings, notes.all());
  }

  private static MoveFigures figures(BenchString string, MoveEstimate estimate) {
    Double screw = string.room().screwMm();
    double saddleMm = estimate.saddleMove() * MM_PER_M;
    return new MoveFigures(
        saddleMm,
        estimate.saddleLow() * MM_PER_M,
        estimate.saddleHigh() * MM_PER_M,
        screw == null ? null : Math.abs(saddleMm) / screw,
        string.room().nut() == NutMovable.NO ? null : estimate.nutMove() * MM_PER_M,
        estimate.cents12Before(),
        estimate.cents12Sd(),
        estimate.cents12After(),
        estimate.rmsBefore(),
        estimate.rmsAfter(),
        estimate.centsPerMetre() / MM_PER_M,
        estimate.setbackNow() * MM_PER_M);
  }

  /**
   * The verdict on a move: leave it when zero lies in the interval or the reading was not typed
   * finely enough to tell; otherwise it must fit into the travel.
   *
   * @param string with its travel and readings
   * @param figures of the move
   * @return what to do
   */
  public static Verdict verdict(BenchString string, MoveFigures figures) {
    boolean zeroInside = figures.lowMm() <= 0 && figures.highMm() >= 0;
    if (zeroInside || belowTypedStep(string, figures)) {
      return Verdict.LEAVE;
    }
    Double room = string.room().toward(figures.saddleMm());
    if (room != null && Math.abs(figures.saddleMm()) > room) {
      return string.room().onePiece() ? Verdict.SLOT : Verdict.NO_ROOM;
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

  /**
   * What stays at fret 12 when the saddle goes to the end of its travel, cents; null where it fits
   * or is not known.
   */
  private static @Nullable Double centsLeft(
      BenchString string, MoveTask task, MoveFigures figures) {
    Double room = string.room().toward(figures.saddleMm());
    if (room == null || Math.abs(figures.saddleMm()) <= room) {
      return null;
    }
    double possible = Math.copySign(room, figures.saddleMm()) / MM_PER_M;
    return MoveSolver.cents12At(task, possible) instanceof Solved<Double> solved
        ? solved.value()
        : null;
  }

  /**
   * The sentences for a move that a second pass asks for.
   *
   * @param string with its travel and readings
   * @param figures of the next move
   * @param verdict on it
   * @return sentences, the most important first
   */
  public static List<Message> notes(BenchString string, MoveFigures figures, Verdict verdict) {
    MoveNotes notes = new MoveNotes(string);
    MoveTask task = AcousticString.task(string, Aim.OCTAVE);
    notes.verdict(verdict, figures, centsLeft(string, task, figures));
    return notes.all();
  }

  /**
   * The strain of a string against the shop's limit, for screens that show it beside the string.
   *
   * @param string what to ask about
   * @return the sentence with the caution, or null where the string is below the limit or no
   *     strength is known
   */
  public @Nullable Message strain(BenchString string) {
    MoveNotes notes = new MoveNotes(string);
    notes.strain(AcousticString.shareOfBreaking(string.string()), breakingShare);
    return notes.all().isEmpty() ? null : notes.all().get(0);
  }
}
