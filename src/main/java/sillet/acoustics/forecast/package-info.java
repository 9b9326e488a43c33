/**
 * What another gauge, construction, tuning, reference pitch, capo or action will do to an
 * instrument, before anything is bought or cut: tension, feel, pull on the neck, strength,
 * intonation.
 *
 * <p>SI units and cents, see {@link sillet.acoustics}. May use every other package of acoustics but
 * {@code findings}.
 */
@NullMarked
package sillet.acoustics.forecast;

import org.jspecify.annotations.NullMarked;
