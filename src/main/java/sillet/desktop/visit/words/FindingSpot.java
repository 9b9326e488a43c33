package sillet.desktop.visit.words;

/**
 * Where a finding shows on the drawing.
 *
 * @param part of the instrument
 * @param fret for a note or a fret, else 0
 */
public record FindingSpot(Part part, int fret) {
  /** The parts that can be pointed at. */
  public enum Part {
    /** A note of its string: the fret, or the one read last where the fret is 0. */
    NOTE,
    NUT,
    FRET,
    STRING,
    SADDLE,
    /** It concerns no place of its own. */
    NOWHERE
  }

  static FindingSpot at(Part part) {
    return new FindingSpot(part, 0);
  }
}
