/**
 * From a string and its readings to the move of its saddle: figures, verdict, findings and a note.
 * A saddle move is positive away from the neck, a nut move positive toward the bridge; millimetres
 * and cents.
 */
@NullMarked
package sillet.logbook.moves;

import org.jspecify.annotations.NullMarked;
