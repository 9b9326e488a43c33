package sillet.acoustics.estimate;

import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;

/**
 * One string read once through: one pass of one visit.
 *
 * @param pass number of the round over the whole instrument, rising from occasion to occasion;
 *     strings of one round share the nut's place and the relief
 * @param wire which piece of string lay there: the same number in one history is the same piece
 * @param lie as typed: constants from the packet, scale, pitch, clearances measured or usual; its
 *     setbacks are where saddle and nut are expected
 * @param heights how well its clearances are known
 * @param saddleMoved m since the occasion before, positive away from the neck; empty = not known;
 *     of no meaning on the first occasion
 * @param nutMoved m since the occasion before, positive toward the bridge; of no meaning on the
 *     first occasion
 * @param against what the readings were compared with
 * @param readings at most one a fret, in any order; may be empty
 */
public record Occasion(
    int pass,
    int wire,
    StringLie lie,
    HeightSds heights,
    OptionalDouble saddleMoved,
    double nutMoved,
    Reference against,
    List<FretReading> readings) {

  /**
   * Checks and copies.
   *
   * @throws IllegalArgumentException if a fret is read twice or a move is not finite
   */
  public Occasion {
    readings = List.copyOf(readings);
    boolean[] seen = new boolean[FretReading.LAST_FRET + 1];
    for (FretReading reading : readings) {
      if (seen[reading.fret()]) {
        throw new IllegalArgumentException("fret " + reading.fret() + " is read twice");
      }
      seen[reading.fret()] = true;
    }
    if (!Double.isFinite(saddleMoved.orElse(0)) || !Double.isFinite(nutMoved)) {
      throw new IllegalArgumentException("moves must be finite");
    }
  }

  /** A string of which only this is known: round 1, wire 1. */
  public static Occasion first(
      StringLie lie, HeightSds heights, Reference against, List<FretReading> readings) {
    return new Occasion(1, 1, lie, heights, OptionalDouble.empty(), 0, against, readings);
  }

  /** The reading at a fret, or null if it was not read. */
  public @Nullable FretReading at(int fret) {
    for (FretReading reading : readings) {
      if (reading.fret() == fret) {
        return reading;
      }
    }
    return null;
  }
}
