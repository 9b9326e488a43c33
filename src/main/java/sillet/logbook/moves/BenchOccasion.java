package sillet.logbook.moves;

import org.jspecify.annotations.Nullable;

/**
 * One string read once through: one pass of one visit.
 *
 * @param string as it lay and was read then; no readings where only others were read in that round
 * @param round number of the round over the whole instrument, rising through its visits
 * @param wire which piece of string lay there: the same number of the same string is the same piece
 * @param saddleMovedMm since the occasion before, positive away from the neck; null where it is not
 *     known, as between visits
 * @param nutMovedMm since the occasion before, positive toward the bridge
 */
public record BenchOccasion(
    BenchString string, int round, int wire, @Nullable Double saddleMovedMm, double nutMovedMm) {

  /**
   * A string that is read for the first time.
   *
   * @param string as it lies and is read
   * @return the only occasion
   */
  public static BenchOccasion only(BenchString string) {
    return new BenchOccasion(string, 1, 1, null, 0);
  }
}
