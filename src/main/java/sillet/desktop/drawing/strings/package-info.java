/**
 * The main drawing: every string one row from nut to bridge, with its cents at the frets, the
 * saddle to move at the end of the line, and room for the words. Drawn from plain records, all
 * texts handed in. Lengths on the instrument are millimetres, places on the screen px, sizes em.
 *
 * <p>Classes named Geometry, StringRows and CellGrid hold no JavaFX types and are tested by
 * themselves.
 */
@NullMarked
package sillet.desktop.drawing.strings;

import org.jspecify.annotations.NullMarked;
