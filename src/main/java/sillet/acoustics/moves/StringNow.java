package sillet.acoustics.moves;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/** One string of an estimate before a move, and its notes after one. */
final class StringNow {
  /** Frets over which an rms runs. */
  static final int FRETS = 12;

  private static final int MOST_STEPS = 30;
  private static final double NEAR_CENTS = 1e-7;

  private final NeckEstimate estimate;
  private final int string;
  private final StringSituation situation;
  private final FrettedPitch pitch;
  private final double[] estimated = new double[NeckEstimate.LAST_FRET + 1];

  private StringNow(NeckEstimate estimate, int string, FrettedPitch pitch) {
    this.estimate = estimate;
    this.string = string;
    this.situation = estimate.situation(string);
    this.pitch = pitch;
    for (int fret = 1; fret < estimated.length; fret++) {
      estimated[fret] = estimate.cents(string, fret).value();
    }
  }

  static Outcome<StringNow> of(NeckEstimate estimate, int string) {
    StringSituation situation = estimate.situation(string);
    return FrettedPitch.of(situation.lie(), situation.fretting())
        .map(pitch -> new StringNow(estimate, string, pitch));
  }

  int string() {
    return string;
  }

  StringSituation situation() {
    return situation;
  }

  Occasion occasion() {
    return estimate.occasion(string);
  }

  Reference against() {
    return occasion().against();
  }

  /** The string after moves, positive as a {@link MoveEstimate} has them; null if there is none. */
  @Nullable FrettedPitch after(double saddleMove, double nutMove) {
    var lie = situation.lie();
    var moved =
        lie.withSaddleSetback(lie.saddleSetback() + saddleMove)
            .withNutSetback(lie.nutSetback() - nutMove);
    return FrettedPitch.of(moved, situation.fretting()) instanceof Solved<FrettedPitch> solved
        ? solved.value()
        : null;
  }

  /** What a move does to a note, cents against the open string. */
  double change(FrettedPitch after, int fret) {
    return after.centsAgainstOpen(fret) - pitch.centsAgainstOpen(fret);
  }

  /** What a move does to fret 12, cents against the string's own reference. */
  double octaveChange(FrettedPitch after) {
    return OctaveNote.cents(after, against()) - OctaveNote.cents(pitch, against());
  }

  /** The saddle move that takes so many cents off fret 12, by the plain length rule repeated. */
  Outcome<Double> moveThatTakes(double cents) {
    double move = 0;
    double perMetre = -OctaveNote.plainSlope(situation.lie());
    for (int step = 0; step < MOST_STEPS; step++) {
      FrettedPitch after = after(move, 0);
      double left = after == null ? Double.NaN : cents + octaveChange(after);
      if (!Double.isFinite(left)) {
        break;
      }
      if (Math.abs(left) < NEAR_CENTS) {
        return Outcome.solved(move);
      }
      move += left / perMetre;
    }
    return Outcome.notSolved("no place of the saddle makes fret 12 true");
  }

  /** Most likely true note against the open string. */
  double estimated(int fret) {
    return estimated[fret];
  }

  /** As read, or the most likely true note where it was not, against the open string. */
  double readOrEstimated(int fret) {
    FretReading reading = occasion().at(fret);
    return reading == null ? estimated[fret] : reading.cents() + reference();
  }

  /** Root mean square over frets 1 to 12 after a move. */
  double rms(FrettedPitch after) {
    double squares = 0;
    for (int fret = 1; fret <= FRETS; fret++) {
      double cents = readOrEstimated(fret) + change(after, fret);
      squares += cents * cents;
    }
    return Math.sqrt(squares / FRETS);
  }

  FrettedPitch pitch() {
    return pitch;
  }

  /** Fret 12 against the string's own reference: as read, or most likely. */
  Figure octave() {
    FretReading reading = occasion().at(OctaveNote.FRET);
    return reading == null ? estimatedOctave() : new Figure(reading.cents(), reading.sd());
  }

  /** The most likely true note at fret 12 against the string's own reference. */
  Figure estimatedOctave() {
    Figure open = estimate.cents(string, OctaveNote.FRET);
    if (against() == Reference.OPEN) {
      return open;
    }
    Figure harmonic =
        estimate.figure(
            string,
            one ->
                FrettedPitch.of(one.lie(), one.fretting()) instanceof Solved<FrettedPitch> solved
                    ? solved.value().harmonicAgainstTwiceOpen()
                    : Double.NaN);
    return new Figure(open.value() - harmonic.value(), Math.hypot(open.sd(), harmonic.sd()));
  }

  /** How far the reference stands above the open string. */
  private double reference() {
    return against() == Reference.HARMONIC ? pitch.harmonicAgainstTwiceOpen() : 0;
  }

  double setback() {
    return situation.lie().saddleSetback();
  }
}
