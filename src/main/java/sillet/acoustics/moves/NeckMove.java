package sillet.acoustics.moves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.hipparchus.linear.RealMatrix;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * The moves that make the sum of squared cents over frets 1 to 12 against the open string least:
 * one saddle move a string, and one nut move for all of them where the nut moves.
 */
final class NeckMove {
  /** Width over which slopes are taken, metres. */
  private static final double STEP = 1e-5;

  private final List<MoveTask> tasks;
  private final List<Knowledge> known;
  private final List<NeckCurve> curves = new ArrayList<>();
  private final boolean nutMoves;

  private NeckMove(List<MoveTask> tasks, List<Knowledge> known, boolean nutMoves) {
    this.tasks = tasks;
    this.known = known;
    this.nutMoves = nutMoves;
    for (int i = 0; i < tasks.size(); i++) {
      curves.add(NeckCurve.of(tasks.get(i), known.get(i).now()));
    }
  }

  /** Estimates in the order of the tasks. */
  static Outcome<List<MoveEstimate>> of(List<MoveTask> tasks, boolean nutMoves) {
    List<Knowledge> known = new ArrayList<>();
    for (MoveTask task : tasks) {
      Outcome<Knowledge> one = Knowledge.of(task);
      if (one instanceof Solved<Knowledge> solved) {
        known.add(solved.value());
      } else if (one instanceof NotSolved<Knowledge> not) {
        return Outcome.notSolved(not.because());
      }
    }
    return new NeckMove(tasks, known, nutMoves).solve();
  }

  private Outcome<List<MoveEstimate>> solve() {
    double[] stay = new double[tasks.size() + (nutMoves ? 1 : 0)];
    return CurveLeastSquares.fit(this::notes, stay, STEP).map(this::estimates);
  }

  /** Every note of every string after the moves; the nut's stands last. */
  private double[] notes(double[] moves) {
    double[] notes = new double[tasks.size() * NeckCurve.FRETS];
    for (int i = 0; i < tasks.size(); i++) {
      if (FrettedPitch.of(lieAfter(i, moves)) instanceof Solved<FrettedPitch> then) {
        NeckCurve after = curves.get(i).moved(known.get(i).now(), then.value());
        for (int fret = 1; fret <= NeckCurve.FRETS; fret++) {
          notes[i * NeckCurve.FRETS + fret - 1] = after.at(fret);
        }
      } else {
        Arrays.fill(notes, Double.NaN);
      }
    }
    return notes;
  }

  private double nutMove(double[] moves) {
    return nutMoves ? moves[tasks.size()] : 0;
  }

  private StringLie lieAfter(int string, double[] moves) {
    StringLie lie = known.get(string).lie();
    return lie.withSaddleSetback(lie.saddleSetback() + moves[string])
        .withNutSetback(lie.nutSetback() - nutMove(moves));
  }

  private List<MoveEstimate> estimates(CurveLeastSquares.Fit fit) {
    List<MoveEstimate> estimates = new ArrayList<>();
    // to first order the best moves are minus this times the notes before
    RealMatrix weights = fit.covariance().multiplyTransposed(fit.slopes());
    for (int i = 0; i < tasks.size(); i++) {
      estimates.add(estimate(i, fit.point().toArray(), weights.getRow(i)));
    }
    return List.copyOf(estimates);
  }

  private MoveEstimate estimate(int string, double[] moves, double[] weights) {
    MoveTask task = tasks.get(string);
    Knowledge knowledge = known.get(string);
    double move = moves[string];
    FrettedPitch then = FrettedPitch.of(lieAfter(string, moves)).orElseThrow();
    double sd = Math.hypot(Math.sqrt(variance(weights)), task.modelShare() * move);
    FretReading octave = task.at(OctaveNote.FRET);
    double modelBefore = OctaveNote.cents(knowledge.now(), task.against());
    double before = octave != null ? octave.cents() : modelBefore;
    NeckCurve curve = curves.get(string);
    return new MoveEstimate(
        move,
        move - Interval.NINETY_FIVE * sd,
        move + Interval.NINETY_FIVE * sd,
        nutMove(moves),
        before,
        octave != null ? octave.sd() : OctaveMove.cents12Sd(knowledge),
        before + OctaveNote.cents(then, task.against()) - modelBefore,
        curve.rms(),
        curve.moved(knowledge.now(), then).rms(),
        SaddleSlope.over(knowledge.lie(), task.against(), move),
        knowledge.lie().saddleSetback());
  }

  private double variance(double[] weights) {
    double variance = 0;
    for (int i = 0; i < tasks.size(); i++) {
      int first = i * NeckCurve.FRETS;
      variance +=
          known.get(i).variance(Arrays.copyOfRange(weights, first, first + NeckCurve.FRETS));
    }
    return variance;
  }
}
