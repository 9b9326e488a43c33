/**
 * The test bench of the whole neck: a technician who knows what is on the packet and reads a tuner
 * takes in virtual instruments; moves are worked out by {@code acoustics} and by plain rules, and
 * the truth is asked of the virtual instrument. {@code WholeNeckTable} prints how good that is.
 */
package sillet.acoustics.bench;
