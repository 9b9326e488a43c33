package sillet.acoustics.findings;

/**
 * How far what causes are made of may be off on an instrument, standard deviations in m.
 *
 * @param nut the nut's place
 * @param fret a fret's place
 * @param gap one slot's height about the line of them all
 */
record Spread(double nut, double fret, double gap) {
  /**
   * Of a sound instrument: nut 0.22 mm, slots 0.05 mm (common practice, no source), frets 0.04 mm
   * (trade texts call 0.08 mm good slotting).
   */
  static final Spread SOUND = new Spread(2.2e-4, 4e-5, 5e-5);

  /** Wide enough for a fault to be taken for what it is while the model is made linear about it. */
  static final Spread FAULTY = new Spread(8e-4, 1.5e-4, 2e-4);
}
