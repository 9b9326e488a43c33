package sillet.acoustics.moves;

import java.util.List;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.Misfit;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;

/**
 * The saddle move that makes fret 12 true. Where it was read, the saddle's present place is the one
 * at which the model of the string as typed gives that reading, and the move leads from there to
 * the place at which the model gives zero: the whole model both times, no other fret enters. Where
 * it was not read now, or was read before a known move as well, the most likely true note counts.
 */
final class OctaveMoves {
  private final NeckEstimate estimate;

  OctaveMoves(NeckEstimate estimate) {
    this.estimate = estimate;
  }

  Outcome<MoveEstimate> of(int string) {
    return StringNow.of(estimate, string)
        .flatMap(
            now -> {
              FretReading reading = now.occasion().at(OctaveNote.FRET);
              return reading == null || readBefore(string)
                  ? byEstimate(now)
                  : byReading(now, reading);
            });
  }

  /** What a move other than the best one leaves at fret 12 against the string's own reference. */
  Outcome<Double> left(int string, double saddleMove) {
    return StringNow.of(estimate, string)
        .flatMap(
            now -> {
              FretReading reading = now.occasion().at(OctaveNote.FRET);
              if (reading == null || readBefore(string)) {
                FrettedPitch after = now.after(saddleMove, 0);
                return after == null
                    ? Outcome.notSolved("the string cannot be tuned after such a move")
                    : finite(now.estimatedOctave().value() + now.octaveChange(after));
              }
              return OctaveNote.with(now.occasion().lie(), now.against(), reading.cents())
                  .flatMap(
                      lie ->
                          finite(
                              OctaveNote.cents(
                                  lie.withSaddleSetback(lie.saddleSetback() + saddleMove),
                                  now.against())));
            });
  }

  private static Outcome<Double> finite(double cents) {
    return Double.isFinite(cents)
        ? Outcome.solved(cents)
        : Outcome.notSolved("the string cannot be tuned to its pitch after such a move");
  }

  /** Whether an earlier reading of fret 12 is tied to the one now by known moves. */
  private boolean readBefore(int string) {
    List<Occasion> occasions = estimate.occasions(string);
    for (int i = occasions.size() - 1; i > 0; i--) {
      if (occasions.get(i).saddleMoved().isEmpty()) {
        return false;
      }
      if (occasions.get(i - 1).at(OctaveNote.FRET) != null) {
        return true;
      }
    }
    return false;
  }

  private Outcome<MoveEstimate> byReading(StringNow now, FretReading reading) {
    StringLie typed = now.occasion().lie();
    Reference against = now.against();
    return OctaveNote.with(typed, against, reading.cents())
        .flatMap(
            here ->
                OctaveNote.with(here, against, 0)
                    .map(there -> byReading(now, reading, here, there)));
  }

  private MoveEstimate byReading(
      StringNow now, FretReading reading, StringLie here, StringLie there) {
    double move = there.saddleSetback() - here.saddleSetback();
    double slope = OctaveNote.slope(here, now.against(), move);
    double sd = reading.sd() / Math.sqrt(weight(now.string())) / Math.abs(slope);
    MoveEstimate moved = Moved.by(now, now.octave(), move, 0, sd);
    return new MoveEstimate(
        move,
        moved.saddleLow(),
        moved.saddleHigh(),
        0,
        reading.cents(),
        reading.sd(),
        OctaveNote.cents(there, now.against()),
        moved.rmsBefore(),
        moved.rmsAfter(),
        slope,
        here.saddleSetback());
  }

  /** How far the reading of fret 12 is believed beside all others. */
  private double weight(int string) {
    int pass = estimate.occasion(string).pass();
    for (Misfit one : estimate.misfits()) {
      if (one.string() == string && one.pass() == pass && one.fret() == OctaveNote.FRET) {
        return one.weight();
      }
    }
    return 1;
  }

  private static Outcome<MoveEstimate> byEstimate(StringNow now) {
    Figure octave = now.estimatedOctave();
    return now.moveThatTakes(octave.value())
        .map(
            move -> {
              double sd = octave.sd() / Math.abs(Moved.slope(now, move));
              return Moved.by(now, octave, move, 0, sd);
            });
  }
}
