package sillet.acoustics.moves;

import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.Reference;

/** What a saddle move does to fret 12. */
final class SaddleSlope {
  /** Shortest move over which the mean is taken, metres; 0.03 cents on a guitar. */
  private static final double SHORTEST = 1e-5;

  private SaddleSlope() {}

  /** Mean change of cents per metre over a move that starts at the lie; negative. */
  static double over(StringLie lie, Reference against, double move) {
    double way = Math.abs(move) < SHORTEST ? SHORTEST : move;
    StringLie then = lie.withSaddleSetback(lie.saddleSetback() + way);
    return (OctaveNote.cents(then, against) - OctaveNote.cents(lie, against)) / way;
  }
}
