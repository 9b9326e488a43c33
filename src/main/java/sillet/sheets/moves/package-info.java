/**
 * The moves as a sheet: one row for each string with its figures, verdict, findings and a note.
 * Moves in millimetres, a saddle's positive away from the neck and a nut's positive toward the
 * bridge; cents; turns of the screw. May use {@code sheets.csv} and {@code logbook}.
 */
@NullMarked
package sillet.sheets.moves;

import org.jspecify.annotations.NullMarked;
