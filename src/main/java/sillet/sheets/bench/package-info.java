/**
 * The bench sheet: one row for each string with what the bench knows of it, read into {@code
 * BenchString}. A sheet is looked through once, so that everything wrong with it is said at once,
 * and then handed out one instrument at a time. A job sheet is a bench sheet with more columns.
 * Units stand in the names of the columns: millimetres, inches, grams per metre, cents. May use
 * {@code sheets.csv} and {@code logbook}.
 */
@NullMarked
package sillet.sheets.bench;

import org.jspecify.annotations.NullMarked;
