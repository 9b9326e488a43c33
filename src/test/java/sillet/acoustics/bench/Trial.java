package sillet.acoustics.bench;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.FretReading;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.MoveTask;
import sillet.acoustics.moves.PassProof;
import sillet.acoustics.moves.SecondPass;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.virtual.Kind;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.Workshop;

/** Takes in instruments, moves every saddle once, and counts what is left, by kind and way. */
final class Trial {
  private static final double NINETY_FIVE = 1.96;

  /** What a move is worked out by. */
  enum Way {
    /** cents x scale/1731.2, interval from the reading alone. */
    LENGTH_RULE,
    /** Fret 12 read once. */
    OCTAVE,
    /** The same, the saddle set by hand, read again, and the move that remained. */
    TWO_PASSES,
    /** Frets 3, 5 and 7 read, fret 12 not. */
    OCTAVE_UNREAD,
    /** Frets 1, 3, 5, 7, 9 and 12 read. */
    NECK,
    /** The same with a nut edge that moves. */
    NECK_AND_NUT
  }

  private final Map<Way, Map<Kind, Tally>> tallies = new EnumMap<>(Way.class);
  private final Technician technician;
  private int instruments;
  private int strangePasses;

  private Trial(Technician technician) {
    this.technician = technician;
    for (Way way : Way.values()) {
      tallies.put(way, new EnumMap<>(Kind.class));
    }
  }

  /**
   * What is tried.
   *
   * @param seed of everything that is left to chance
   * @param instruments how many, the kinds in turn
   * @param rampSd standard deviation of the bridge plate's slope against the frets
   * @param foundShare how far off saddles are found, standard deviation as a share of the scale
   */
  record Plan(long seed, int instruments, double rampSd, double foundShare) {
    /** Bridge plates that lie true, saddles found 2 mm (sd) off on a scale of 648. */
    static Plan usual(long seed, int instruments) {
      return new Plan(seed, instruments, 0, 2.0 / 648);
    }
  }

  /** Runs a trial; each way gets readings of its own but for the one at fret 12. */
  static Trial run(Plan plan, List<Way> ways) {
    Workshop workshop = new Workshop(new Luck(plan.seed()), plan.rampSd());
    Trial trial = new Trial(new Technician(new Luck(plan.seed() + 1), plan.foundShare()));
    Kind[] kinds = Kind.values();
    for (int i = 0; i < plan.instruments(); i++) {
      for (BenchString string : trial.technician.takeIn(workshop.build(kinds[i % kinds.length]))) {
        FretReading octave = trial.technician.read(string, 12);
        for (Way way : ways) {
          trial.move(way, string, octave);
        }
      }
      trial.instruments++;
    }
    return trial;
  }

  private void move(Way way, BenchString string, FretReading octave) {
    switch (way) {
      case LENGTH_RULE -> lengthRule(string, octave);
      case OCTAVE -> octave(way, string, List.of(octave));
      case TWO_PASSES -> twoPasses(string, octave);
      case OCTAVE_UNREAD -> octave(way, string, technician.read(string, 3, 5, 7));
      case NECK -> neck(way, string, technician.read(string, 1, 3, 5, 7, 9, 12));
      case NECK_AND_NUT -> neck(way, string, technician.read(string, 1, 3, 5, 7, 9, 12));
    }
  }

  private void lengthRule(BenchString string, FretReading octave) {
    double metresPerCent = string.typed().scale() / Cents.PER_UNIT;
    double move = octave.cents() * metresPerCent;
    double half = NINETY_FIVE * octave.sd() * metresPerCent;
    countOctave(Way.LENGTH_RULE, string, move, move - half, move + half);
  }

  private void octave(Way way, BenchString string, List<FretReading> readings) {
    MoveEstimate estimate =
        MoveSolver.solve(task(string, readings, Aim.OCTAVE, false)).orElseThrow();
    countOctave(way, string, estimate.saddleMove(), estimate.saddleLow(), estimate.saddleHigh());
  }

  /** The first saddle is set by hand, the second is set as it was worked out. */
  private void twoPasses(BenchString string, FretReading octave) {
    MoveEstimate first =
        MoveSolver.solve(task(string, List.of(octave), Aim.OCTAVE, false)).orElseThrow();
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
    strangePasses += proof.notAsPredicted() ? 1 : 0;
    double move = between - string.found() + proof.nextMove();
    double half = NINETY_FIVE * proof.nextSd();
    countOctave(Way.TWO_PASSES, string, move, move - half, move + half);
  }

  private void countOctave(Way way, BenchString string, double move, double low, double high) {
    Truth truth = string.truth();
    double left = truth.cents(12, string.against(), string.found() + move);
    double best = truth.bestForOctave(string.against()) - string.found();
    tally(way, string.kind()).add(left, low, best, high);
  }

  /** What is left is how much more rms remains than the best place would have. */
  private void neck(Way way, BenchString string, List<FretReading> readings) {
    boolean nut = way == Way.NECK_AND_NUT;
    MoveEstimate estimate = MoveSolver.solve(task(string, readings, Aim.NECK, nut)).orElseThrow();
    double[] best = string.truth().bestForNeck(nut);
    double left =
        string.truth().rms(string.found() + estimate.saddleMove(), -estimate.nutMove())
            - string.truth().rms(best[0], best[1]);
    tally(way, string.kind())
        .add(left, estimate.saddleLow(), best[0] - string.found(), estimate.saddleHigh());
  }

  private static MoveTask task(
      BenchString string, List<FretReading> readings, Aim aim, boolean nutFree) {
    double share = MoveTask.modelShareOf(string.typed().constants());
    return new MoveTask(string.typed(), readings, string.against(), aim, nutFree, share);
  }

  private Tally tally(Way way, Kind kind) {
    return tallies.get(way).computeIfAbsent(kind, unused -> new Tally());
  }

  /** How many strings did not do as the first move predicted. */
  int strangePasses() {
    return strangePasses;
  }

  int instruments() {
    return instruments;
  }

  Tally of(Way way, Kind kind) {
    return tally(way, kind);
  }

  /** All kinds together. */
  Tally of(Way way) {
    Tally all = new Tally();
    tallies.get(way).values().forEach(all::addAll);
    return all;
  }
}
