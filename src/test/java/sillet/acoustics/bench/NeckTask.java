package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.Workshop;

/**
 * Nine frets read with 0.4 cent of scatter, one move, and the rms that is then left over frets 1 to
 * 12 against what the best possible move would leave.
 */
final class NeckTask implements Task {
  static final String MODEL = "all strings together";
  static final String ONE_BY_ONE = "string by string";
  static final String LINEAR = "plain linear fit";
  static final String RULE = "usual rule, fret 12 alone";

  static final double SCATTER = 0.4;
  private static final int[] FRETS = {1, 2, 3, 5, 7, 9, 12, 15, 17};

  static Row row(NutFreedom nut, String way) {
    String task =
        switch (nut) {
          case FIXED -> "neck, saddles alone";
          case EACH -> "neck, every nut edge movable";
          case WHOLE -> "neck, nut movable as a whole";
        };
    return new Row(task, way);
  }

  @Override
  public void run(Case one, Score score) {
    Luck luck = one.luck(this, 1);
    Technician technician = new Technician(luck, Technician.Habits.usual(SCATTER));
    Workshop workshop = new Workshop(one.luck(this, 0), 0);
    List<BenchString> strings =
        technician.takeIn(workshop.build(one.kind()), luck.chance(0.5), Reference.OPEN);
    List<List<FretReading>> readings = new ArrayList<>();
    for (BenchString string : strings) {
      readings.add(technician.read(string, FRETS));
    }
    NeckEstimate together = Solver.estimate(strings, readings);
    List<NeckEstimate> oneByOne = Solver.oneByOne(strings, readings);
    for (NutFreedom nut : NutFreedom.values()) {
      Round round = new Round(strings, readings, nut, score);
      List<double[]> best = round.best();
      round.count(MODEL, Solver.neck(together, nut), best);
      if (nut != NutFreedom.WHOLE) {
        List<Move> alone = new ArrayList<>();
        oneByOne.forEach(estimate -> alone.addAll(Solver.neck(estimate, nut)));
        round.count(ONE_BY_ONE, alone, best);
        round.count(LINEAR, round.plain(true), best);
        round.count(RULE, round.plain(false), best);
      }
    }
  }

  /** One way the nut may move. */
  private record Round(
      List<BenchString> strings, List<List<FretReading>> readings, NutFreedom nut, Score score) {
    private List<double[]> best() {
      if (nut != NutFreedom.WHOLE) {
        return strings.stream()
            .map(string -> string.truth().bestForNeck(nut == NutFreedom.EACH))
            .toList();
      }
      double[] together = Truth.bestForWholeNut(strings.stream().map(BenchString::truth).toList());
      List<double[]> best = new ArrayList<>();
      for (int i = 0; i < strings.size(); i++) {
        best.add(new double[] {together[i], together[strings.size()]});
      }
      return best;
    }

    private List<Move> plain(boolean fit) {
      List<Move> moves = new ArrayList<>();
      for (int i = 0; i < strings.size(); i++) {
        double scale = strings.get(i).typed().scale();
        List<FretReading> read = readings.get(i);
        FretReading octave =
            read.stream().filter(reading -> reading.fret() == 12).findFirst().orElseThrow();
        Move usual = PlainMethods.usualRule(scale, octave);
        moves.add(
            fit
                ? PlainMethods.linearFit(scale, read, nut == NutFreedom.EACH)
                : Move.plain(usual.saddle(), 0));
      }
      return moves;
    }

    private void count(String way, List<Move> moves, List<double[]> best) {
      for (int i = 0; i < strings.size(); i++) {
        BenchString string = strings.get(i);
        Truth truth = string.truth();
        Move move = moves.get(i);
        Tally tally = score.of(row(nut, way), string.kind());
        tally.rms(
            truth.rms(string.found() + move.saddle(), -move.nut()),
            truth.rms(best.get(i)[0], best.get(i)[1]));
        if (move.hasInterval()) {
          tally.interval(move.low(), best.get(i)[0] - string.found(), move.high());
        }
      }
    }
  }
}
