/**
 * Virtual instruments to try moves on: strings, necks and bridges reckoned from first principles
 * and <em>not</em> from the formulas of {@code acoustics}, so that a move worked out there meets
 * something it does not know. This package uses none of {@code acoustics} (checked by a test). Its
 * ranges are chosen to resemble instruments, not to suit the moves.
 *
 * <p>Metres, kilograms, newtons, hertz; cents.
 */
package sillet.acoustics.virtual;
