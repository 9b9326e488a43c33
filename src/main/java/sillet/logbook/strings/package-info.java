/**
 * String sets, tunings, and a string as it is fitted to one instrument. Gauges in inches, scales in
 * millimetres, unit mass in grams per metre, pitches in hertz.
 */
@NullMarked
package sillet.logbook.strings;

import org.jspecify.annotations.NullMarked;
