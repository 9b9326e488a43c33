/**
 * One stay of an instrument in the shop: arrival, checks, passes, readings, moves made, work lines
 * and notes. Lengths in millimetres, cents positive when sharp.
 */
@NullMarked
package sillet.logbook.visits;

import org.jspecify.annotations.NullMarked;
