/**
 * What a tuner says of a note: what it was compared with, several tries taken together, one reading
 * a fret.
 *
 * <p>Uses nothing of Sillet. Differences in cents, positive when the note is sharp.
 */
@NullMarked
package sillet.acoustics.readings;

import org.jspecify.annotations.NullMarked;
