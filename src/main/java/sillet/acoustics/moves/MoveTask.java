package sillet.acoustics.moves;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.StringConstants;

/**
 * What a move is to be found for.
 *
 * @param lie the string on its neck; its saddle setback is only where to start looking, for where
 *     the saddle stands is inferred from the readings; its nut setback counts as known at fret 12
 * @param readings at most one a fret, in any order; may be empty
 * @param against what they were compared with
 * @param aim what to make true
 * @param nutFree whether the nut edge can move as well; heeded by {@link Aim#NECK} only
 * @param modelShare standard deviation of a move by the model's own error, as a share of the move,
 *     0 to 1; see {@link #modelShareOf}
 */
public record MoveTask(
    StringLie lie,
    List<FretReading> readings,
    Reference against,
    Aim aim,
    boolean nutFree,
    double modelShare) {
  /**
   * Checks and copies the readings.
   *
   * @throws IllegalArgumentException if a fret is read twice or the share is out of range
   */
  public MoveTask {
    readings = List.copyOf(readings);
    boolean[] seen = new boolean[FretReading.LAST_FRET + 1];
    for (FretReading reading : readings) {
      if (seen[reading.fret()]) {
        throw new IllegalArgumentException("fret " + reading.fret() + " is read twice");
      }
      seen[reading.fret()] = true;
    }
    if (!(modelShare >= 0 && modelShare <= 1)) {
      throw new IllegalArgumentException("model share is " + modelShare);
    }
  }

  /**
   * How far the model may be trusted with a string.
   *
   * @param constants of the string
   * @return share of the move, about 0.005 for a plain steel string, 0.009 where a core was guessed
   */
  public static double modelShareOf(StringConstants constants) {
    return ModelShare.of(constants);
  }

  /**
   * The reading at a fret.
   *
   * @param fret 1 or more
   * @return the reading, or null if it was not read
   */
  public @Nullable FretReading at(int fret) {
    for (FretReading reading : readings) {
      if (reading.fret() == fret) {
        return reading;
      }
    }
    return null;
  }
}
