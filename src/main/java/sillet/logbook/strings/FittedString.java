package sillet.logbook.strings;

import sillet.logbook.units.Pitch;

/**
 * A string on its instrument, tuned.
 *
 * @param number 1 on the treble side, by place and not by pitch
 * @param pitch what it is tuned to, offsets of the tuning included
 * @param scaleMm nominal scale of this string, millimetres; from its own nut where it has one
 * @param make gauge and construction
 */
public record FittedString(int number, Pitch pitch, double scaleMm, StringMake make) {}
