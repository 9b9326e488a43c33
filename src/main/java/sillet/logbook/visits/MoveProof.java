package sillet.logbook.visits;

/**
 * What a second reading says of the move before it.
 *
 * @param centsBefore fret 12 before the move
 * @param centsNow fret 12 now
 * @param withinOneCent true if that is close enough to leave it
 * @param asPredicted false if the note changed more than three standard deviations differently from
 *     what the model said
 */
public record MoveProof(
    double centsBefore, double centsNow, boolean withinOneCent, boolean asPredicted) {}
