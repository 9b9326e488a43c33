/**
 * One instrument's visits: what was read as received and as left, what was done, what was declined.
 * Uses controls, drawing and theme, the store and the logbook. Cents are positive for sharp, moves
 * positive away from the neck, lengths millimetres until they are written in the shop's unit.
 */
@NullMarked
package sillet.desktop.history;

import org.jspecify.annotations.NullMarked;
