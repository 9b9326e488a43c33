package sillet.acoustics.moves;

/**
 * The best move and what is known of it.
 *
 * @param saddleMove metres, positive away from the neck
 * @param saddleLow lower end of the 95 % interval of the best position, as a move; with a movable
 *     nut of the joint best position
 * @param saddleHigh upper end
 * @param nutMove metres, positive toward the bridge; 0 where the nut stays
 * @param cents12Before fret 12 against the task's reference: as read, or as estimated
 * @param cents12Sd its standard deviation, cents
 * @param cents12After what the model leaves at fret 12 against the same reference
 * @param rmsBefore root mean square over frets 1 to 12 against the open string, cents: as read, by
 *     the model where unread
 * @param rmsAfter the same after the move
 * @param centsPerMetre change of fret 12 per metre of saddle move, mean over the move, negative
 * @param setbackNow where the saddle is taken to stand, metres from its nominal place
 */
public record MoveEstimate(
    double saddleMove,
    double saddleLow,
    double saddleHigh,
    double nutMove,
    double cents12Before,
    double cents12Sd,
    double cents12After,
    double rmsBefore,
    double rmsAfter,
    double centsPerMetre,
    double setbackNow) {}
