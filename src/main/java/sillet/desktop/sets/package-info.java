/**
 * String sets: what lies in the drawer, how hard each string of a set pulls at a tuning and scale,
 * which gauge would pull as hard as wanted, and what strings are made of. Uses controls, drawing
 * and theme, the store, the logbook and the acoustics of sets. Tensions in newton, gauges in
 * inches, unit mass in grams per metre, scales in millimetres.
 */
@NullMarked
package sillet.desktop.sets;

import org.jspecify.annotations.NullMarked;
