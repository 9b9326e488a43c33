package sillet.acoustics.virtual;

/**
 * How a string is pressed down.
 *
 * @param behind way behind the fret as a share of the space between this fret and the one before
 * @param depth how far the string is pushed below the straight line from saddle over fret, metres
 */
record Finger(double behind, double depth) {}
