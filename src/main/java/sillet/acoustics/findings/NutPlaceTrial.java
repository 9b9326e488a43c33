package sillet.acoustics.findings;

import java.util.List;
import sillet.acoustics.findings.LinearNeck.Amount;

/**
 * The nut's place, shared by all strings. Nuts are usually 0.2 mm off (standard deviation, chosen);
 * what is called too far or too near is more than twice that.
 */
final class NutPlaceTrial implements CauseTrial {
  /** From which a nut is called out of place, m. */
  static final double OFF = 5.0e-4;

  private static final double SIGNIFICANT = 2.05;
  private static final int FEWEST_STRINGS = 3;
  private static final int FEWEST_FRETS = 4;

  @Override
  public List<Suspect> look(NeckCase notes, LinearNeck neck) {
    if (notes.stringsWith(FEWEST_FRETS) < FEWEST_STRINGS) {
      return List.of();
    }
    Amount far = neck.amount(notes.nut());
    if (Math.abs(far.value()) < OFF || far.significance() < SIGNIFICANT) {
      return List.of();
    }
    return List.of(
        new Suspect(
            far.value() > 0 ? Kind.NUT_FAR : Kind.NUT_NEAR,
            Suspect.NONE,
            Suspect.NONE,
            false,
            Math.abs(far.value()),
            far.sd(),
            far.gain(),
            SIGNIFICANT * SIGNIFICANT,
            Suspect.Shapes.of(notes.nut())));
  }
}
