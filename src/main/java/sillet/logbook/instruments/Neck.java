package sillet.logbook.instruments;

import org.jspecify.annotations.Nullable;

/**
 * Neck and scale of an instrument.
 *
 * @param strings how many strings, each string of a course counted
 * @param scaleTrebleMm nominal scale on the treble side: twice from nut to fret 12, millimetres
 * @param scaleBassMm the same on the bass side; equal unless the frets are fanned
 * @param frets how many frets
 * @param radiusMm radius of the fretboard, millimetres; null for flat or not measured
 * @param leftHanded true if it is strung for the left hand
 */
public record Neck(
    int strings,
    double scaleTrebleMm,
    double scaleBassMm,
    int frets,
    @Nullable Double radiusMm,
    boolean leftHanded) {

  /**
   * The nominal scale of one string: between the two sides in even steps, as the frets are
   * straight.
   *
   * @param string number, 1 on the treble side
   * @return millimetres
   */
  public double scaleMm(int string) {
    if (strings == 1) {
      return scaleTrebleMm;
    }
    double share = (string - 1.0) / (strings - 1.0);
    return scaleTrebleMm + share * (scaleBassMm - scaleTrebleMm);
  }
}
