/**
 * From tuner readings to saddle and nut moves: how sure the tries of one note are, where the saddle
 * stands, where it must go, how sure that is, and what a second pass proves.
 *
 * <p>Uses {@code acoustics.solve}, {@code wire}, {@code stiff}, {@code neck}, {@code readings} and
 * {@code estimate}. Lengths in metres, pitch differences in cents, positive when the note is sharp.
 * A saddle move is positive away from the neck; a nut move is positive toward the bridge, which is
 * minus the change of the nut setback.
 */
@NullMarked
package sillet.acoustics.moves;

import org.jspecify.annotations.NullMarked;
