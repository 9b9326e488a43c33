/**
 * The entry grid of a visit: which frets are shown, which cell comes next, what is typed in a cell
 * and what it means, and the drawing the cells stand on. The models know no controls. Cents are
 * positive when sharp; string 1 is on the treble side, fret 0 is the open string.
 */
@NullMarked
package sillet.desktop.visit.readings;

import org.jspecify.annotations.NullMarked;
