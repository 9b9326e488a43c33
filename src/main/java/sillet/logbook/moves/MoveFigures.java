package sillet.logbook.moves;

import org.jspecify.annotations.Nullable;

/**
 * The figures of one string's move: always the best estimate, never rounded to zero or cut to the
 * travel.
 *
 * @param saddleMm best move, positive away from the neck
 * @param lowMm lower end of its 95 % interval
 * @param highMm upper end
 * @param turns of the screw, without sign; null where no screw pitch is known
 * @param nutMm best nut move, positive toward the bridge; null for a fixed nut
 * @param cents12Before fretted 12 minus its reference, as read or estimated
 * @param cents12Sd its standard deviation
 * @param cents12After the same after the move, by the model
 * @param rmsBefore root mean square over frets 1 to 12, cents
 * @param rmsAfter the same after the move
 * @param centsPerMm what a millimetre away from the neck does to fret 12, negative
 * @param setbackMm where the readings say the saddle stands, away from its nominal place
 */
public record MoveFigures(
    double saddleMm,
    double lowMm,
    double highMm,
    @Nullable Double turns,
    @Nullable Double nutMm,
    double cents12Before,
    double cents12Sd,
    double cents12After,
    double rmsBefore,
    double rmsAfter,
    double centsPerMm,
    double setbackMm) {

  /** Standard deviations on each side of the best move inside a 95 % interval. */
  public static final double SDS_IN_INTERVAL = 1.96;

  /**
   * The same readings with a move that an earlier pass has taught better.
   *
   * @param nextMm best move, positive away from the neck
   * @param sdMm its standard deviation
   * @param centsPerMmSeen what a millimetre really does to fret 12
   * @param screwMm way per turn, null if not known
   * @return figures with the new move
   */
  public MoveFigures withMove(
      double nextMm, double sdMm, double centsPerMmSeen, @Nullable Double screwMm) {
    double reach = SDS_IN_INTERVAL * sdMm;
    return new MoveFigures(
        nextMm,
        nextMm - reach,
        nextMm + reach,
        screwMm == null ? null : Math.abs(nextMm) / screwMm,
        nutMm,
        cents12Before,
        cents12Sd,
        cents12After,
        rmsBefore,
        rmsAfter,
        centsPerMmSeen,
        setbackMm);
  }

  /**
   * Which way it goes.
   *
   * @return the direction of the best estimate
   */
  public Direction direction() {
    if (saddleMm == 0) {
      return Direction.STAY;
    }
    return saddleMm > 0 ? Direction.AWAY : Direction.TOWARD;
  }
}
