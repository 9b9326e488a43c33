/**
 * Pitch as numbers: cents, equal temperament, and where frets stand.
 *
 * <p>SI units and cents, see {@link sillet.acoustics}. Uses nothing of Sillet.
 */
@NullMarked
package sillet.acoustics.pitch;

import org.jspecify.annotations.NullMarked;
