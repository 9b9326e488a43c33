package sillet.acoustics.virtual;

/**
 * What is wrong with an instrument on purpose. Strings are counted from 0 at the treble side.
 *
 * @see VirtualInstrument#with(Fault)
 */
public sealed interface Fault {
  /** The slot of one string is too high, metres. */
  record HighSlot(int string, double by) implements Fault {}

  /** The nut is out of place for all strings, metres away from the saddle. */
  record NutPlace(double by) implements Fault {}

  /** One fret is out of place, metres toward the bridge, under the first and the last string. */
  record FretPlace(int fret, double underFirst, double underLast) implements Fault {}

  /** One string's mass swings along its length. */
  record UnevenString(int string, double share, double wave, double phase) implements Fault {}
}
