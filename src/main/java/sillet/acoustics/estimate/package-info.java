/**
 * What is known of an instrument from everything that was read of it, all strings together: the
 * most likely lie of every string and how sure any figure of it is.
 *
 * <p>SI units and cents, see {@link sillet.acoustics}. A standard deviation is called sd. Uses
 * {@code acoustics.solve}, {@code pitch}, {@code wire}, {@code stiff}, {@code neck} and {@code
 * readings}.
 */
@NullMarked
package sillet.acoustics.estimate;

import org.jspecify.annotations.NullMarked;
