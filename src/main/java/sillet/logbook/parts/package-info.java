/**
 * Parts of an instrument that are measured by themselves: where the frets stand, where the pickups
 * stand and how high. Measured anew they are written down anew; what was measured before stays.
 * Lengths in millimetres, frets from the nut's edge, pickups from the saddle.
 */
@NullMarked
package sillet.logbook.parts;

import org.jspecify.annotations.NullMarked;
