/**
 * String physics of a fretted instrument, from the wire to the pitch of a fretted note.
 *
 * <p>Everything below this package is in SI units and says so only here: lengths in m, masses in
 * kg, unit masses in kg/m, forces in N, stress and modulus in Pa, frequencies in Hz. The one
 * exception is the cent, the 1200th part of an octave. Setbacks follow the signs of the trade: a
 * saddle setback is positive away from the neck, a nut setback positive away from the bridge.
 *
 * <p>A caller's bug (a length that is not finite, a fret below zero) is an {@link
 * IllegalArgumentException}; data that simply cannot work (a string too stiff for its length) is an
 * answer, {@link sillet.acoustics.solve.NotSolved}.
 *
 * <p>May use {@code java.lang}, {@code java.util}, Hipparchus and JSpecify's annotations, nothing
 * else.
 */
@NullMarked
package sillet.acoustics;

import org.jspecify.annotations.NullMarked;
