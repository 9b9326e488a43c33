package sillet.logbook.visits;

import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.NutMovable;

/**
 * What a visit is reckoned for.
 *
 * @param aim what shall become true
 * @param nut whether the nut can move, and how
 */
public record VisitAim(AimChoice aim, NutMovable nut) {
  /** While nobody has chosen: fret 12 true, the nut stays. */
  public static final VisitAim USUAL = new VisitAim(AimChoice.OCTAVE, NutMovable.NO);
}
