/**
 * Instruments as they stand on the bench: kind, maker, scale per side, bridge, saddle screws and
 * their sense. Lengths in millimetres.
 */
@NullMarked
package sillet.logbook.instruments;

import org.jspecify.annotations.NullMarked;
