package sillet.logbook.visits;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.moves.PassProof;
import sillet.acoustics.moves.SecondPass;
import sillet.acoustics.readings.Reference;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.Finding;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NoteRead;
import sillet.logbook.moves.Verdict;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;

/**
 * The advice of a later pass: what the move before really did, taken together with what the model
 * knows.
 *
 * @param advice what to do next; null while the string has not been read
 * @param proof what the pass says of the move before; null where there is nothing to prove
 */
record ProvedAdvice(@Nullable MoveAdvice advice, @Nullable MoveProof proof) {
  private static final int OCTAVE = 12;
  private static final double MM_PER_M = 1e3;

  /** What holds of a string whatever its moves did. */
  private static final Set<String> STANDING =
      Set.of("move.not-as-predicted", "move.wild-try", "move.tries-apart", "move.strain");

  static ProvedAdvice of(@Nullable MoveAdvice now, @Nullable StringPass before, AimChoice aim) {
    MoveFigures figures = now == null ? null : now.figures();
    MoveFigures earlier = figuresOf(before);
    Double made = before == null ? null : before.madeMm();
    NoteRead first = before == null ? null : before.string().readings().at(OCTAVE);
    NoteRead second = now == null ? null : now.string().readings().at(OCTAVE);
    if (now == null || figures == null || earlier == null || made == null || before == null) {
      return new ProvedAdvice(now, null);
    }
    Reference against = now.string().readings().against();
    if (first == null || second == null || before.string().readings().against() != against) {
      return new ProvedAdvice(now, null);
    }
    PassProof proof =
        SecondPass.combine(
            first.cents(),
            first.sdCents(),
            second.cents(),
            second.sdCents(),
            made / MM_PER_M,
            earlier.centsPerMm() * MM_PER_M);
    MoveProof said =
        new MoveProof(
            first.cents(), second.cents(), proof.withinOneCent(), !proof.notAsPredicted());
    MoveAdvice told = told(now, said);
    boolean octave = aim.kind() == AimChoice.Kind.OCTAVE;
    return new ProvedAdvice(octave ? advice(told, figures, proof, said) : told, said);
  }

  /** The advice with the finding that the move did not act as it must, where it did not. */
  private static MoveAdvice told(MoveAdvice now, MoveProof said) {
    if (said.asPredicted()) {
      return now;
    }
    Message evidence =
        Message.of(
            "move.not-as-predicted",
            Figures.signed(said.centsBefore(), 1),
            Figures.signed(said.centsNow(), 1));
    List<FindingReport> findings = new ArrayList<>(now.findings());
    findings.add(0, strange(now, evidence));
    List<Message> notes = new ArrayList<>(now.notes());
    notes.add(0, evidence);
    return new MoveAdvice(now.string(), now.figures(), now.verdict(), now.neck(), findings, notes);
  }

  private static @Nullable MoveFigures figuresOf(@Nullable StringPass pass) {
    MoveAdvice advice = pass == null ? null : pass.advice();
    return advice == null ? null : advice.figures();
  }

  private static MoveAdvice advice(
      MoveAdvice now, MoveFigures figures, PassProof proof, MoveProof said) {
    MoveFigures next =
        figures.withMove(
            proof.nextMove() * MM_PER_M,
            proof.nextSd() * MM_PER_M,
            proof.combinedCentsPerMetre() / MM_PER_M,
            now.string().room().screwMm());
    Verdict verdict =
        proof.withinOneCent() ? Verdict.LEAVE : MoveAdvisor.verdict(now.string(), next);
    List<Message> notes = new ArrayList<>();
    String before = Figures.signed(said.centsBefore(), 1);
    String after = Figures.signed(said.centsNow(), 1);
    now.notes().stream().filter(note -> STANDING.contains(note.key())).forEach(notes::add);
    if (said.withinOneCent()) {
      notes.add(Message.of("move.within-one-cent", before, after));
    } else {
      notes.addAll(MoveAdvisor.notes(now.string(), next, verdict));
    }
    return new MoveAdvice(now.string(), next, verdict, now.neck(), now.findings(), notes);
  }

  private static FindingReport strange(MoveAdvice now, Message evidence) {
    int number = now.string().string().number();
    Message again = Message.of("finding.reading.do");
    return new FindingReport(Finding.READING, number, null, false, 0, evidence, again, null);
  }
}
