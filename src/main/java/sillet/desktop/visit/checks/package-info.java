/**
 * What is measured beside the readings: relief, action, clearances, pickup height, as received and
 * as left, each with its fret and method. Millimetres.
 */
@NullMarked
package sillet.desktop.visit.checks;

import org.jspecify.annotations.NullMarked;
