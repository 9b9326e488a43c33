/**
 * The test bench of the moves: a technician who knows what is on the packet and reads a tuner, sets
 * virtual instruments by {@code acoustics.moves} and by the plain length rule, and the truth is
 * taken from the virtual instrument.
 */
package sillet.acoustics.bench;
