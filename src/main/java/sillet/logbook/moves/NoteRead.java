package sillet.logbook.moves;

/**
 * The tries of one note taken together.
 *
 * @param cents their median, less what the open string itself read, positive when sharp
 * @param sdCents its standard deviation, tuner, hand and rounding together
 */
public record NoteRead(double cents, double sdCents) {}
