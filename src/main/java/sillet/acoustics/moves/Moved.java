package sillet.acoustics.moves;

import sillet.acoustics.estimate.Figure;
import sillet.acoustics.neck.FrettedPitch;

/** What a move of one string leaves. */
final class Moved {
  /** Shortest move over which a mean slope is taken, metres; 0.03 cents on a guitar. */
  private static final double SHORTEST = 1e-5;

  private Moved() {}

  /**
   * The figures of a move.
   *
   * @param octave fret 12 before it, against the string's own reference, cents
   * @param saddle metres away from the neck
   * @param nut metres toward the bridge
   * @param sdByNotes of the best place of the saddle as far as the notes tell, metres; the model's
   *     own share of the move is added
   */
  static MoveEstimate by(
      StringNow string, Figure octave, double saddle, double nut, double sdByNotes) {
    FrettedPitch after = string.after(saddle, nut);
    if (after == null) {
      throw new IllegalStateException("the string cannot be tuned after its move");
    }
    double share = ModelShare.of(string.occasion().lie().constants());
    double sd = Math.hypot(sdByNotes, share * saddle);
    return new MoveEstimate(
        saddle,
        saddle - Figure.NINETY_FIVE * sd,
        saddle + Figure.NINETY_FIVE * sd,
        nut,
        octave.value(),
        octave.sd(),
        octave.value() + string.octaveChange(after),
        string.rms(string.pitch()),
        string.rms(after),
        slope(string, saddle),
        string.setback());
  }

  /** Mean change of fret 12 per metre over a saddle move; negative. */
  static double slope(StringNow string, double move) {
    double way = Math.abs(move) < SHORTEST ? SHORTEST : move;
    FrettedPitch after = string.after(way, 0);
    return after == null ? Double.NaN : string.octaveChange(after) / way;
  }
}
