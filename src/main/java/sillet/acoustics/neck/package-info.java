/**
 * The string over the neck: clearances, the stretch of a fretted note, its cents at every fret, and
 * where saddle and nut stand best.
 *
 * <p>SI units, see {@link sillet.acoustics}. Saddle setback positive away from the neck, nut
 * setback positive away from the bridge, both from where the nominal scale puts them. Uses {@code
 * solve}, {@code pitch}, {@code wire} and {@code stiff}.
 */
@NullMarked
package sillet.acoustics.neck;

import org.jspecify.annotations.NullMarked;
