/**
 * The page of one visit: what is read, what that asks for, what was done, and the job sheet. Puts
 * together the parts in the packages below it. May use the controls, the drawings, the theme, the
 * store, the sheets and the logbook; no other screen and no shell. Millimetres, cents, inches for
 * gauges.
 */
@NullMarked
package sillet.desktop.visit;

import org.jspecify.annotations.NullMarked;
