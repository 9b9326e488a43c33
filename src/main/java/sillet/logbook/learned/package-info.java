/**
 * What the readings of an instrument have taught about it: figures with their interval, and from
 * how many passes and visits they come. May use {@code logbook.visits} and what that may use.
 * Lengths in millimetres, positive as in the README.
 */
@NullMarked
package sillet.logbook.learned;

import org.jspecify.annotations.NullMarked;
