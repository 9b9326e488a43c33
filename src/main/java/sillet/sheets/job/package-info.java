/**
 * The job sheet: one row for each string and pass of a visit, with what was read, what it asked
 * for, what was done and what is left. Millimetres, inches for gauges, cents, degrees Celsius,
 * percent; days as in ISO 8601. May use {@code sheets.csv}, {@code sheets.moves} and {@code
 * logbook}.
 */
@NullMarked
package sillet.sheets.job;

import org.jspecify.annotations.NullMarked;
