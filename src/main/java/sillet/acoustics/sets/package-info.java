/**
 * A set of strings as a whole: how evenly it pulls, which gauge would pull as hard as wanted, and
 * what strings are made of, with the source of each figure.
 *
 * <p>SI units, see {@link sillet.acoustics}. Uses {@code wire}, {@code stiff}, {@code solve} and
 * the loads of {@code forecast}.
 */
@NullMarked
package sillet.acoustics.sets;

import org.jspecify.annotations.NullMarked;
