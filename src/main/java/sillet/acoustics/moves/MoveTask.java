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
   * Share by which a move is off even where the string is known: how the string is pressed, how its
   * ends are held, heights nobody measured. Each cent by which they raise fret 12 unknown to the
   * model changes the move by 2/1731 of itself; 0.5 % stands for four such cents.
   */
  private static final double KNOWN_STRING = 0.005;

  /**
   * What an error of the axial stiffness does. Stretch and bending raise fret 12 by some 10 cents
   * on a thick string, which is 2 x 10/1731 of the move; bending errs by up to double the share.
   */
  private static final double PER_STIFFNESS = 0.03;

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
    return Math.min(1, Math.hypot(KNOWN_STRING, PER_STIFFNESS * constants.relativeSd()));
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
