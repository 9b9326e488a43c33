/**
 * Frets as parts: where they belong, where they were measured, and what the difference costs.
 *
 * <p>SI units and cents, see {@link sillet.acoustics}: places in m from the nut, positive toward
 * the bridge; cents positive where the fret makes its notes sharp. Uses {@code pitch} only.
 */
@NullMarked
package sillet.acoustics.frets;

import org.jspecify.annotations.NullMarked;
