package sillet.acoustics.moves;

import sillet.acoustics.wire.StringConstants;

/**
 * How far the model may be trusted with what a move does, as a share of the move: 0.5 % even where
 * the string is known, for each cent by which pressing, ends and heights raise fret 12 unknown to
 * the model changes the move by 2/1731 of itself, and four such cents may be; and 3 % of the error
 * of the axial stiffness, since stretch and bending raise fret 12 by some 10 cents on a thick
 * string.
 */
final class ModelShare {
  private static final double KNOWN_STRING = 0.005;
  private static final double PER_STIFFNESS = 0.03;

  private ModelShare() {}

  /** Standard deviation of a move as a share of it: 0.005 plain steel, 0.009 a guessed core. */
  static double of(StringConstants constants) {
    return Math.min(1, Math.hypot(KNOWN_STRING, PER_STIFFNESS * constants.relativeSd()));
  }
}
