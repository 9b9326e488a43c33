package sillet.sheets.job;

import java.util.List;
import java.util.Locale;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.moves.Verdict;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.VisitRecord;
import sillet.sheets.csv.CsvLine;
import sillet.sheets.moves.AdviceCells;

/**
 * The cells of one string in one pass. The move is the one that was made; where none is recorded it
 * is the one that was advised, and the note says so.
 */
final class PassCells {
  private static final int OCTAVE = 12;
  private static final int NOTE_DECIMALS = 2;

  private final VisitRecord record;
  private final Texts texts;

  PassCells(VisitRecord record, Texts texts) {
    this.record = record;
    this.texts = texts;
  }

  void write(CsvLine line, StringPasses string, int pass) {
    StringPass one = string.passes().get(pass);
    readings(line.count(one.pass()), one.string().readings(), string.cents12(pass));
    move(line, one);
    MoveAdvice advice = one.advice();
    line.word(advice == null ? "" : advice.verdict().word())
        .word(advice == null ? "" : AdviceCells.findings(advice))
        .figure(predicted(one), AdviceCells.CENTS_DECIMALS)
        .figure(string.leftAfter(pass), AdviceCells.CENTS_DECIMALS);
  }

  private static void readings(CsvLine line, NoteReadings readings, @Nullable Double cents12) {
    boolean read = !readings.frets().isEmpty();
    Tries octave = readings.frets().get(OCTAVE);
    line.word(read ? readings.against().name().toLowerCase(Locale.ROOT) : "")
        .figure(cents12, AdviceCells.CENTS_DECIMALS)
        .count(octave == null ? null : Integer.valueOf(octave.cents().size()))
        .measure(read ? Double.valueOf(readings.sdCents()) : null);
  }

  private void move(CsvLine line, StringPass one) {
    Double made = one.madeMm();
    MoveFigures figures = figures(one);
    Double saddleMm = made == null && figures != null ? Double.valueOf(figures.saddleMm()) : made;
    line.figure(saddleMm, AdviceCells.MM_DECIMALS)
        .figure(turns(one), AdviceCells.CENTS_DECIMALS)
        .word(saddleMm == null ? "" : AdviceCells.direction(saddleMm))
        .figure(nutMm(one), AdviceCells.MM_DECIMALS);
  }

  private @Nullable Double turns(StringPass one) {
    Double made = one.madeMm();
    MoveFigures figures = figures(one);
    if (made == null) {
      return figures == null ? null : figures.turns();
    }
    List<MadeMove> moves = made(one);
    if (moves.size() == 1) {
      return moves.get(0).turns();
    }
    Double screw = one.string().room().screwMm();
    return screw == null ? null : Double.valueOf(Math.abs(made) / screw);
  }

  private @Nullable Double nutMm(StringPass one) {
    MoveFigures figures = figures(one);
    if (one.madeMm() == null) {
      return figures == null ? null : figures.nutMm();
    }
    return made(one).stream()
        .map(MadeMove::nutMm)
        .filter(Objects::nonNull)
        .reduce(Double::sum)
        .orElse(null);
  }

  private static @Nullable Double predicted(StringPass one) {
    MoveFigures figures = figures(one);
    if (one.madeMm() == null && figures != null && verdict(one) == Verdict.MOVE) {
      return figures.cents12After();
    }
    return one.predictedCents();
  }

  String note(StringPass one) {
    MoveAdvice advice = one.advice();
    String said = advice == null ? "" : AdviceCells.note(advice, texts);
    Double made = one.madeMm();
    if (made != null) {
      String mm = Figures.fixed(Math.abs(made), NOTE_DECIMALS);
      return (said + " " + texts.say("job.moved", mm, AdviceCells.direction(made))).strip();
    }
    return verdict(one) == Verdict.MOVE ? said + " " + texts.say("job.not-moved") : said;
  }

  void frets(CsvLine line, StringPass one, List<Integer> frets) {
    NoteReadings readings = one.string().readings();
    for (int fret : frets) {
      Tries tries = fret == 0 ? readings.open() : readings.frets().get(fret);
      line.word(tries == null ? "" : tries.written());
    }
  }

  private List<MadeMove> made(StringPass one) {
    return record.moves().stream()
        .filter(m -> m.pass() == one.pass() && m.string() == one.string().string().number())
        .toList();
  }

  private static @Nullable Verdict verdict(StringPass one) {
    MoveAdvice advice = one.advice();
    return advice == null ? null : advice.verdict();
  }

  private static @Nullable MoveFigures figures(StringPass one) {
    MoveAdvice advice = one.advice();
    return advice == null ? null : advice.figures();
  }
}
