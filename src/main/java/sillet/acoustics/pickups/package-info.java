/**
 * Pickups as parts: where one listens along the string, which harmonics it cannot hear there, and
 * how its magnet pulls at the pitch.
 *
 * <p>SI units and cents, see {@link sillet.acoustics}: distances in m from the bridge. The string
 * is taken as ideal and the pickup as a point: a coil listens over a width of its own, so what is
 * said to be unheard is weak and not gone [D]. Uses {@code pitch} only.
 */
@NullMarked
package sillet.acoustics.pickups;

import org.jspecify.annotations.NullMarked;
