package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.logbook.text.Message;

/** Tells for each string of an instrument how far its saddle goes, and what a saddle cannot do. */
public final class MoveAdvisor {
  /** 1200/ln 2: cents at fret 12 for a move as long as the scale, by the plain length rule. */
  public static final double CENTS_PER_SCALE = 1731.234;

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
   * Advises on the strings of one instrument together, read for the first time.
   *
   * @param strings all of the same instrument, string 1 first; readings may be missing
   * @param aim what shall become true
   * @return one advice for each string, in the same order, and what concerns all; figures that
   *     cannot be solved are missing and say why
   */
  public InstrumentAdvice advise(List<BenchString> strings, AimChoice aim) {
    return adviseOn(strings.stream().map(BenchHistory::of).toList(), aim);
  }

  /**
   * Advises on the strings of one instrument together, with everything that was read before.
   *
   * @param strings all of the same instrument, string 1 first
   * @param aim what shall become true
   * @return one advice for each string, in the same order, and what concerns all; figures that
   *     cannot be solved are missing and say why
   */
  public InstrumentAdvice adviseOn(List<BenchHistory> strings, AimChoice aim) {
    if (strings.isEmpty()) {
      return new InstrumentAdvice(List.of(), List.of(), null);
    }
    KnownNeck neck = KnownNeck.of(strings);
    List<FindingReport> findings = InstrumentFindings.of(neck);
    List<Outcome<MoveEstimate>> moves = new InstrumentMoves(neck, aim).solve();
    List<MoveAdvice> advice = new ArrayList<>(strings.size());
    for (int i = 0; i < strings.size(); i++) {
      advice.add(advice(neck, i, moves.get(i), findings));
    }
    return new InstrumentAdvice(advice, findings, StraightBridge.of(neck, advice, aim));
  }

  private MoveAdvice advice(
      KnownNeck neck, int index, Outcome<MoveEstimate> outcome, List<FindingReport> findings) {
    BenchString string = neck.strings().get(index).now();
    MoveNotes notes = new MoveNotes(string);
    notes.wildTries();
    Verdict verdict = Verdict.LEAVE;
    MoveFigures figures = null;
    List<FretCents> cents = List.of();
    NeckEstimate estimate = neck.estimate();
    if (outcome instanceof Solved<MoveEstimate> solved && estimate != null) {
      AdviceFigures out = new AdviceFigures(estimate, neck.place(index), string);
      figures = out.of(solved.value());
      cents = out.neck(solved.value());
      verdict = MoveVerdict.of(string, figures);
      notes.verdict(verdict, figures, out.centsLeft(figures));
    } else if (outcome instanceof NotSolved<MoveEstimate> not) {
      notes.notSolved(not.because());
    }
    notes.strain(AcousticString.shareOfBreaking(string.string()), breakingShare);
    List<FindingReport> own =
        findings.stream().filter(one -> one.concerns(string.string().number())).toList();
    return new MoveAdvice(string, figures, verdict, cents, own, notes.all());
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
    return MoveVerdict.of(string, figures);
  }

  /**
   * The verdict on a move that is only forecast, where no reading is behind fret 12.
   *
   * @param room what saddle and bridge let it do
   * @param figures of the move
   * @return leave it where zero lies in the interval, else whether it fits into the travel
   */
  public static Verdict forecastVerdict(SaddleRoom room, MoveFigures figures) {
    boolean zeroInside = figures.lowMm() <= 0 && figures.highMm() >= 0;
    return zeroInside ? Verdict.LEAVE : MoveVerdict.fitting(room, figures);
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
    Double room = string.room().toward(figures.saddleMm());
    Double left = null;
    if (room != null && Math.abs(figures.saddleMm()) > room) {
      double possible = Math.copySign(room, figures.saddleMm());
      left = figures.cents12Before() + figures.centsPerMm() * possible;
    }
    notes.verdict(verdict, figures, left);
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
