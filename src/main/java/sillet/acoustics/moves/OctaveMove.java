package sillet.acoustics.moves;

import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.solve.Outcome;

/**
 * The saddle move that makes fret 12 true. Where it was read, the saddle's present place is the one
 * at which the model gives that reading, and the move leads from there to the place at which the
 * model gives zero: the whole model both times, no other fret enters. Where it was not read, the
 * present place is the most likely one, and all the rest of what is not known widens the interval.
 */
final class OctaveMove {
  private OctaveMove() {}

  static Outcome<MoveEstimate> of(MoveTask task) {
    return present(task).flatMap(present -> from(task, present));
  }

  /** How the string lies before the move; fret 12 as read or estimated, and how sure that is. */
  record Present(StringLie lie, FrettedPitch pitch, double cents12, double cents12Sd) {}

  static Outcome<Present> present(MoveTask task) {
    FretReading octave = task.at(OctaveNote.FRET);
    if (octave == null) {
      return Knowledge.of(task).map(known -> estimated(task, known));
    }
    return OctaveNote.with(task.lie(), task.against(), octave.cents())
        .flatMap(
            lie ->
                FrettedPitch.of(lie)
                    .map(pitch -> new Present(lie, pitch, octave.cents(), octave.sd())));
  }

  private static Present estimated(MoveTask task, Knowledge known) {
    double cents = OctaveNote.cents(known.now(), task.against());
    return new Present(known.lie(), known.now(), cents, cents12Sd(known));
  }

  static double cents12Sd(Knowledge known) {
    double[] weights = new double[NeckCurve.FRETS];
    weights[OctaveNote.FRET - 1] = 1;
    return Math.sqrt(known.variance(weights));
  }

  private static Outcome<MoveEstimate> from(MoveTask task, Present present) {
    return OctaveNote.with(present.lie(), task.against(), 0)
        .flatMap(lie -> FrettedPitch.of(lie).map(then -> estimate(task, present, lie, then)));
  }

  private static MoveEstimate estimate(
      MoveTask task, Present present, StringLie then, FrettedPitch pitchThen) {
    double after = OctaveNote.cents(pitchThen, task.against());
    double move = then.saddleSetback() - present.lie().saddleSetback();
    double slope = SaddleSlope.over(present.lie(), task.against(), move);
    double sd = Math.hypot(present.cents12Sd() / slope, task.modelShare() * move);
    NeckCurve curve = NeckCurve.of(task, present.pitch());
    return new MoveEstimate(
        move,
        move - Interval.NINETY_FIVE * sd,
        move + Interval.NINETY_FIVE * sd,
        0,
        present.cents12(),
        present.cents12Sd(),
        after,
        curve.rms(),
        curve.moved(present.pitch(), pitchThen).rms(),
        slope,
        present.lie().saddleSetback());
  }
}
