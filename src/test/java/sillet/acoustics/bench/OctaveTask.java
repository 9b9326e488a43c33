package sillet.acoustics.bench;

import java.util.List;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.PassProof;
import sillet.acoustics.moves.SecondPass;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.Workshop;

/**
 * Fret 12 read once with 0.1 cent of scatter, one move, and what is then left at fret 12. The tuner
 * alone, which shows 0.1 cent, leaves a median of 0.070 and a 95th percentile of 0.204 cent.
 */
final class OctaveTask implements Task {
  static final String TASK = "octave, fret 12 read";
  static final Row MODEL = new Row(TASK, "model");
  static final Row RULE = new Row(TASK, "usual rule");
  static final Row TWO_PASSES = new Row(TASK, "set by hand and read again");
  static final Row UNREAD = new Row(TASK, "frets 3 5 7 read, 12 not");
  static final Row FAR = new Row(TASK, "model, found 5 mm (sd) off");
  static final Row FAR_RULE = new Row(TASK, "usual rule, found 5 mm (sd) off");
  static final Row RAMP = new Row(TASK, "model, bridge plate slopes 0.3 degrees (sd)");

  /** Second passes that did not go as predicted. */
  static final Row STRANGE = new Row(TASK, "second pass not as predicted");

  private static final double SCATTER = 0.1;
  private static final double RAMP_SD = 0.006;
  private static final double FAR_SHARE = 5.0 / 648;

  @Override
  public void run(Case one, Score score) {
    Technician near = new Technician(one.luck(this, 1), Technician.Habits.usual(SCATTER));
    for (BenchString string : takeIn(one, 0, near)) {
      FretReading octave = near.read(string, 12);
      count(score, MODEL, string, move(string, octave));
      count(score, RULE, string, PlainMethods.usualRule(string.typed().scale(), octave));
      twoPasses(score, string, octave, near);
      MoveEstimate unread = Solver.octave(string, near.read(string, 3, 5, 7));
      count(score, UNREAD, string, Solver.move(unread));
    }
    Technician far = new Technician(one.luck(this, 2), new Technician.Habits(SCATTER, FAR_SHARE));
    for (BenchString string : takeIn(one, 0, far)) {
      FretReading octave = far.read(string, 12);
      count(score, FAR, string, move(string, octave));
      count(score, FAR_RULE, string, PlainMethods.usualRule(string.typed().scale(), octave));
    }
    Technician sloping = new Technician(one.luck(this, 3), Technician.Habits.usual(SCATTER));
    for (BenchString string : takeIn(one, RAMP_SD, sloping)) {
      count(score, RAMP, string, move(string, sloping.read(string, 12)));
    }
  }

  private List<BenchString> takeIn(Case one, double ramp, Technician technician) {
    Luck luck = one.luck(this, ramp == 0 ? 0 : 4);
    return technician.takeIn(new Workshop(luck, ramp).build(one.kind()));
  }

  private static Move move(BenchString string, FretReading octave) {
    return Solver.move(Solver.octave(string, List.of(octave)));
  }

  /** The first saddle is set by hand, the second is set as it was worked out. */
  private static void twoPasses(
      Score score, BenchString string, FretReading octave, Technician technician) {
    MoveEstimate first = Solver.octave(string, List.of(octave));
    double between = technician.set(string.found() + first.saddleMove());
    FretReading again = technician.read(string, 12, between);
    PassProof proof =
        SecondPass.combine(
            octave.cents(),
            octave.sd(),
            again.cents(),
            again.sd(),
            first.saddleMove(),
            first.centsPerMetre());
    score.of(STRANGE, string.kind()).ask(proof.notAsPredicted());
    double move = between - string.found() + proof.nextMove();
    double half = 1.96 * proof.nextSd();
    count(score, TWO_PASSES, string, new Move(move, move - half, move + half, 0));
  }

  private static void count(Score score, Row row, BenchString string, Move move) {
    Truth truth = string.truth();
    Tally tally = score.of(row, string.kind());
    tally.error(truth.cents(12, string.against(), string.found() + move.saddle()));
    double best = truth.bestForOctave(string.against()) - string.found();
    tally.interval(move.low(), best, move.high());
  }
}
