/**
 * What another gauge, construction, tuning, reference, capo or action will ask for, before anything
 * is bought or cut. May use {@code logbook.visits} and {@code logbook.moves} and what these may
 * use. Gauges in inches, lengths in millimetres, tensions in newtons, cents positive when sharp;
 * moves are from where saddle and nut stand now.
 */
@NullMarked
package sillet.logbook.forecast;

import org.jspecify.annotations.NullMarked;
