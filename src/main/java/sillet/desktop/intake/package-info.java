/**
 * Taking in an instrument: whose it is, what it is, what is on it, what is asked for. One page, by
 * keyboard alone; it ends in actions and on the page of the visit. May use the controls, the theme,
 * the store and the logbook; no other screen and no shell. Millimetres, gauges in inches, hertz.
 */
@NullMarked
package sillet.desktop.intake;

import org.jspecify.annotations.NullMarked;
