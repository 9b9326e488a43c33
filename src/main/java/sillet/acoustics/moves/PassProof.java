package sillet.acoustics.moves;

/**
 * What a second reading after a move proves.
 *
 * @param combinedCentsPerMetre what a metre away from the neck does to the note, cents, taken from
 *     the model and from what was seen together; negative for a saddle
 * @param sd its standard deviation
 * @param nextMove the move that remains, metres, positive away from the neck
 * @param nextSd its standard deviation, metres
 * @param withinOneCent the second reading lies within one cent of true
 * @param notAsPredicted the note changed by more than three standard deviations from what the move
 *     must do: a slipped saddle, a string still settling, a wrong reading or a wrong gauge
 */
public record PassProof(
    double combinedCentsPerMetre,
    double sd,
    double nextMove,
    double nextSd,
    boolean withinOneCent,
    boolean notAsPredicted) {}
