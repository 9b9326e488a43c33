/**
 * Numbers, lengths, gauges, pitches and cents as people type them and as they are said back.
 * Lengths are kept in millimetres, gauges in inches, pitches in hertz; cents are positive when
 * sharp. May use {@code logbook.text} and {@code acoustics.pitch}.
 */
@NullMarked
package sillet.logbook.units;

import org.jspecify.annotations.NullMarked;
