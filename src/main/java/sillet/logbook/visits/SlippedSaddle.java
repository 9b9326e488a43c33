package sillet.logbook.visits;

import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.NoteRead;

/**
 * Tells a saddle that did not go where it was said to go. Such a move counts as unknown, or one
 * slipped saddle would spoil what everything after it is reckoned from.
 */
final class SlippedSaddle {
  private static final int OCTAVE = 12;

  /** The plain length rule is off by up to 8 % on short scales and thick strings. */
  private static final double RULE_SHARE = 0.08;

  /** What a hand sets a saddle to, millimetres. */
  private static final double HAND_MM = 0.1;

  private static final double TOO_FAR_OFF = 3;

  private SlippedSaddle() {}

  /**
   * Compares fret 12 before and after with the plain length rule; says no where fret 12 was not
   * read both times against the same.
   *
   * @param movedMm what is recorded, positive away from the neck
   */
  static boolean is(BenchString before, BenchString now, double movedMm) {
    NoteRead first = before.readings().at(OCTAVE);
    NoteRead second = now.readings().at(OCTAVE);
    if (first == null
        || second == null
        || before.readings().against() != now.readings().against()) {
      return false;
    }
    double centsPerMm = -MoveAdvisor.CENTS_PER_SCALE / now.string().scaleMm();
    double off = second.cents() - first.cents() - centsPerMm * movedMm;
    double read = Math.hypot(first.sdCents(), second.sdCents());
    double rule = RULE_SHARE * centsPerMm * movedMm;
    double hand = movedMm == 0 ? 0 : HAND_MM * centsPerMm;
    return Math.abs(off) > TOO_FAR_OFF * Math.hypot(read, Math.hypot(rule, hand));
  }
}
