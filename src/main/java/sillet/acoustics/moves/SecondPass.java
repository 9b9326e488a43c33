package sillet.acoustics.moves;

/**
 * Reads a move's effect from the readings before and after it and takes it together with what the
 * model predicts, each weighted by its variance. A pass that did not go as predicted teaches
 * nothing: then the model stands alone, and the pass is marked.
 */
public final class SecondPass {
  /**
   * How well the model knows what a move does, as a share. The whole correction of the plain length
   * rule is 0.1 to 2 % at fret 12, so 2 % holds even where that correction is not known.
   */
  public static final double MODEL_SHARE = 0.02;

  /**
   * Standard deviation of a move set by hand and rule, metres: a tenth of a millimetre. Chosen;
   * common practice, no source.
   */
  public static final double HAND_SD = 1e-4;

  private static final double DONE_CENTS = 1;
  private static final double TOO_FAR_OFF = 3;

  private SecondPass() {}

  /**
   * Proves a move.
   *
   * @param centsBefore reading before the move
   * @param sdBefore its standard deviation, cents, above zero
   * @param centsAfter reading after the move and after retuning, against the same reference
   * @param sdAfter its standard deviation, cents, above zero
   * @param moveMade metres, positive away from the neck; 0 if the saddle stayed, then nothing is
   *     learned of the sensitivity
   * @param predictedCentsPerMetre what the model says a metre does, cents, not zero
   * @return the combined sensitivity, the move that remains, and whether the string behaved
   * @throws IllegalArgumentException if a value is not finite or out of range
   */
  public static PassProof combine(
      double centsBefore,
      double sdBefore,
      double centsAfter,
      double sdAfter,
      double moveMade,
      double predictedCentsPerMetre) {
    finite("reading before", centsBefore);
    finite("reading after", centsAfter);
    finite("move", moveMade);
    positive("sd before", sdBefore);
    positive("sd after", sdAfter);
    positive("sensitivity", Math.abs(predictedCentsPerMetre));

    double modelSd = MODEL_SHARE * Math.abs(predictedCentsPerMetre);
    double handSd = moveMade == 0 ? 0 : HAND_SD * Math.abs(predictedCentsPerMetre);
    double seenVariance = sdBefore * sdBefore + sdAfter * sdAfter + handSd * handSd;
    double change = centsAfter - centsBefore;

    double off = Math.abs(change - predictedCentsPerMetre * moveMade);
    boolean strange = off > TOO_FAR_OFF * Math.hypot(Math.sqrt(seenVariance), modelSd * moveMade);

    // change/move has the variance seen/move^2; in this form a small move needs no division
    double modelWeight = 1 / (modelSd * modelSd);
    double seenWeight = strange ? 0 : moveMade * moveMade / seenVariance;
    double seen = strange ? 0 : moveMade * change / seenVariance;
    double combined = (modelWeight * predictedCentsPerMetre + seen) / (modelWeight + seenWeight);
    double sd = 1 / Math.sqrt(modelWeight + seenWeight);

    double next = -centsAfter / combined;
    double nextSd = Math.hypot(sdAfter, next * sd) / Math.abs(combined);
    return new PassProof(combined, sd, next, nextSd, Math.abs(centsAfter) <= DONE_CENTS, strange);
  }

  private static void finite(String what, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(what + " is " + value);
    }
  }

  private static void positive(String what, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " is " + value);
    }
  }
}
