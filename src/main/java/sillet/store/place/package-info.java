/**
 * Where a logbook lies: from what was typed, from the environment, or the usual folder of the
 * platform. Touches no file but to see whether a folder is there. May use the engine for what an
 * address may hold.
 */
@NullMarked
package sillet.store.place;

import org.jspecify.annotations.NullMarked;
