/**
 * The fret sheet: where the frets of a scale belong, where those of an instrument were measured,
 * and what the difference costs. Uses controls, drawing and theme, the store, the logbook and the
 * acoustics of frets. Lengths in millimetres, cents positive when sharp.
 */
@NullMarked
package sillet.desktop.frets;

import org.jspecify.annotations.NullMarked;
