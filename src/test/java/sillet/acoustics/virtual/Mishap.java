package sillet.acoustics.virtual;

import java.util.List;

/** Draws faults by chance, as large as the task asks. */
public enum Mishap {
  /** A slot 0.45 mm high. */
  HIGH_SLOT,
  /** A nut 0.7 to 1.3 mm too far from the saddle. */
  FAR_NUT,
  /** A nut 0.7 to 1.3 mm too near. */
  NEAR_NUT,
  /** A fret 0.35 to 0.55 mm off. */
  FRET,
  /** A fret that is off to one side under the first string and to the other under the last. */
  SLANTED_FRET,
  /** A string whose mass swings by 1.5 % along its length, in waves of 0.3 to 0.8 of the scale. */
  UNEVEN_STRING;

  /** Frets that are put out of place. */
  private static final List<Integer> FRETS = List.of(1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 15, 17);

  /** A fault for an instrument. */
  public Fault draw(Luck luck, VirtualInstrument instrument) {
    int string = (int) luck.between(0, instrument.strings().size());
    return switch (this) {
      case HIGH_SLOT -> new Fault.HighSlot(string, 4.5e-4);
      case FAR_NUT -> new Fault.NutPlace(luck.between(7e-4, 1.3e-3));
      case NEAR_NUT -> new Fault.NutPlace(-luck.between(7e-4, 1.3e-3));
      case FRET -> fret(luck, 1);
      case SLANTED_FRET -> fret(luck, -1);
      case UNEVEN_STRING ->
          new Fault.UnevenString(
              string,
              0.015,
              luck.between(0.3, 0.8) * instrument.neck().scale(),
              luck.between(0, 2 * Math.PI));
    };
  }

  private static Fault fret(Luck luck, int otherEnd) {
    int fret = FRETS.get((int) luck.between(0, FRETS.size()));
    double off = luck.between(3.5e-4, 5.5e-4) * (luck.chance(0.5) ? 1 : -1);
    return new Fault.FretPlace(fret, off, otherEnd * off);
  }
}
