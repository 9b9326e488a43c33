package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.findings.LinearNeck.Amount;

/**
 * One string's nut slot against its neighbours: its clearance at fret 1, by its own curve at the
 * low frets and by the feeler gauge where it was measured, beyond the straight line that the
 * clearances of all strings follow across the board (bass strings usually lie a little higher).
 */
final class SlotTrial implements CauseTrial {
  /**
   * Height above the neighbours from which a slot is called high, m; common practice, no source.
   */
  static final double HIGH = 2.0e-4;

  /** Where a feeler gauge was laid under the string, and where the curve alone speaks. */
  private static final double SIGNIFICANT = 3.0;

  private static final double SIGNIFICANT_UNMEASURED = 2.2;
  private static final int FEWEST_STRINGS = 3;
  private static final int FEWEST_FRETS = 4;
  private static final int LOW_FRETS = 3;

  @Override
  public List<Suspect> look(NeckCase notes, LinearNeck neck) {
    List<Suspect> suspects = new ArrayList<>();
    if (notes.stringsWith(FEWEST_FRETS) < FEWEST_STRINGS) {
      return suspects;
    }
    for (int string = 0; string < notes.strings(); string++) {
      if (notes.fretsOf(string) < FEWEST_FRETS || notes.lowestFret(string) > LOW_FRETS) {
        continue;
      }
      double[] shape = notes.slots().get(string);
      Amount amount = neck.amount(shape);
      double significant = notes.gapMeasured(string) ? SIGNIFICANT : SIGNIFICANT_UNMEASURED;
      if (amount.value() >= HIGH && amount.significance() >= significant) {
        suspects.add(
            new Suspect(
                Kind.NUT_HIGH,
                string,
                Suspect.NONE,
                false,
                amount.value(),
                amount.sd(),
                amount.gain(),
                significant * significant,
                Suspect.Shapes.of(shape)));
      }
    }
    return suspects;
  }
}
