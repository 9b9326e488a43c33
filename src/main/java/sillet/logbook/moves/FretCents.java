package sillet.logbook.moves;

/**
 * One note of a string as it is and as the move leaves it, against the open string.
 *
 * @param fret 1 to 24
 * @param nowCents best estimate of the true note, readings and model together
 * @param sdCents its standard deviation
 * @param read true if the tuner was asked at this fret; false if it is estimated
 * @param afterCents the same note after the move
 */
public record FretCents(
    int fret, double nowCents, double sdCents, boolean read, double afterCents) {}
