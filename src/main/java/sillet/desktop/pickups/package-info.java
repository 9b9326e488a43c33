/**
 * The pickup sheet of an instrument: where each pickup stands, which harmonics it hardly hears, and
 * the log of heights. Uses controls, drawing and theme, the store, the logbook and the acoustics of
 * pickups. Lengths in millimetres, from the saddle.
 */
@NullMarked
package sillet.desktop.pickups;

import org.jspecify.annotations.NullMarked;
