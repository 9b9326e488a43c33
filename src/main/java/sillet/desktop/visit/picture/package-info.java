/**
 * Turns a visit into what the drawing of the strings shows: cents and what is expected at the
 * frets, where each saddle stands and where it should go. Millimetres, positive away from the neck.
 */
@NullMarked
package sillet.desktop.visit.picture;

import org.jspecify.annotations.NullMarked;
