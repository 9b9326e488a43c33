/**
 * Comma-separated text in and out, whatever the sheet is about: encoding, separator, cells with
 * their place in the file, typed cells on the way out, files that are whole or not there. May use
 * {@code logbook.text} and {@code logbook.units}; the CSV library stays inside.
 */
@NullMarked
package sillet.sheets.csv;

import org.jspecify.annotations.NullMarked;
