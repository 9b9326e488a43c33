/**
 * What a saddle cannot cure: a slot, a nut, a fret, a string or a reading that stands out of what
 * is expected of a sound instrument.
 *
 * <p>SI units and cents, see {@link sillet.acoustics}. May use every other package of acoustics but
 * {@code forecast}.
 */
@NullMarked
package sillet.acoustics.findings;

import org.jspecify.annotations.NullMarked;
