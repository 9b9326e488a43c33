/**
 * The history of an instrument as a sheet: one row for each visit and string, the newest visit
 * first. Millimetres, inches for gauges, cents, degrees Celsius, percent; days as in ISO 8601. May
 * use {@code sheets.csv}, {@code sheets.job} and {@code logbook}.
 */
@NullMarked
package sillet.sheets.history;

import org.jspecify.annotations.NullMarked;
