package sillet.acoustics.moves;

import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.RootSearch;
import sillet.acoustics.solve.Solved;

/** The note at fret 12 as a function of where the saddle stands, and the way back. */
final class OctaveNote {
  static final int FRET = 12;

  /** A nanometre: 3e-6 cents. */
  private static final double TOLERANCE = 1e-9;

  private static final int MOST_EVALUATIONS = 60;
  private static final RootSearch SEARCH = new RootSearch(TOLERANCE, MOST_EVALUATIONS);

  /** The plain length rule overshoots by 0 to 8 %: where to expect the place, and how near. */
  private static final double EXPECTED = 0.97;

  private static final double NEAR = 0.06;
  private static final double NEAR_AT_LEAST = 2e-6;

  /** Farthest setback looked at, either way, as a share of the scale: 400 cents at fret 12. */
  private static final double FARTHEST = 0.25;

  /** Shortest move over which a mean slope is taken, metres; 0.03 cents on a guitar. */
  private static final double SHORTEST = 1e-5;

  private OctaveNote() {}

  /** Cents at fret 12; NaN where the string cannot be tuned. */
  static double cents(StringLie lie, Reference against) {
    return FrettedPitch.of(lie) instanceof Solved<FrettedPitch> solved
        ? cents(solved.value(), against)
        : Double.NaN;
  }

  /** Cents at fret 12. */
  static double cents(FrettedPitch pitch, Reference against) {
    return against == Reference.HARMONIC
        ? pitch.centsAgainstHarmonic(FRET)
        : pitch.centsAgainstOpen(FRET);
  }

  /** Cents per metre of saddle move if length were all there is; negative. */
  static double plainSlope(StringLie lie) {
    return -Cents.PER_UNIT / lie.scale();
  }

  /** Mean change of cents per metre over a move that starts at the lie; negative. */
  static double slope(StringLie lie, Reference against, double move) {
    double way = Math.abs(move) < SHORTEST ? SHORTEST : move;
    StringLie then = lie.withSaddleSetback(lie.saddleSetback() + way);
    return (cents(then, against) - cents(lie, against)) / way;
  }

  /** The lie whose saddle stands so that fret 12 has these cents. */
  static Outcome<StringLie> with(StringLie lie, Reference against, double cents) {
    double start = lie.saddleSetback();
    double off = cents(lie, against) - cents;
    if (!Double.isFinite(off)) {
      return Outcome.notSolved("the string cannot be tuned to its pitch");
    }
    if (off == 0) {
      return Outcome.solved(lie);
    }
    double way = -EXPECTED * off / plainSlope(lie);
    double reach = NEAR * Math.abs(way) + NEAR_AT_LEAST;
    Outcome<Double> near = find(lie, against, cents, start + way, reach);
    if (near instanceof Solved<Double> solved) {
      return Outcome.solved(lie.withSaddleSetback(solved.value()));
    }
    Outcome<Double> far = find(lie, against, cents, 0, FARTHEST * lie.scale());
    return far instanceof Solved<Double> solved
        ? Outcome.solved(lie.withSaddleSetback(solved.value()))
        : Outcome.notSolved("no place of the saddle gives such a reading at fret 12");
  }

  private static Outcome<Double> find(
      StringLie lie, Reference against, double cents, double middle, double reach) {
    return SEARCH.find(
        setback -> cents(lie.withSaddleSetback(setback), against) - cents,
        middle - reach,
        middle + reach);
  }
}
