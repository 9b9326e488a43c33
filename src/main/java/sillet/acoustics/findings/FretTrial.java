package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.findings.LinearNeck.Amount;

/**
 * One fret's place, shared by all strings, beyond what slotting allows (within 0.08 mm, trade
 * texts); slanted where it grows across the board so that its sign turns over.
 */
final class FretTrial implements CauseTrial {
  /** From which a fret is called out of place, m. */
  static final double OFF = 2.2e-4;

  private static final double SIGNIFICANT = 3.1;
  private static final double SIGNIFICANT_SLANT = 3.6;

  /** What the second amount of a slanted fret costs. */
  private static final double ONE_MORE = 3;

  private static final int FEWEST_STRINGS = 3;
  private static final int FEWEST_TO_SLANT = 4;
  private static final int FEWEST_FRETS = 4;

  @Override
  public List<Suspect> look(NeckCase notes, LinearNeck neck) {
    List<Suspect> suspects = new ArrayList<>();
    if (notes.stringsWith(FEWEST_FRETS) < FEWEST_STRINGS) {
      return suspects;
    }
    for (int fret = 1; fret < notes.frets().size(); fret++) {
      int read = notes.stringsReadAt(fret);
      if (read >= FEWEST_STRINGS) {
        straight(notes, neck, fret, suspects);
      }
      if (read >= FEWEST_TO_SLANT) {
        slanted(notes, neck, fret, suspects);
      }
    }
    return suspects;
  }

  private static void straight(NeckCase notes, LinearNeck neck, int fret, List<Suspect> suspects) {
    double[] shape = notes.frets().get(fret);
    Amount amount = neck.amount(shape);
    double significant = SIGNIFICANT;
    if (stands(amount, significant)) {
      double enough = significant * significant;
      suspects.add(suspect(fret, false, amount, amount.gain(), enough, Suspect.Shapes.of(shape)));
    }
  }

  private static void slanted(NeckCase notes, LinearNeck neck, int fret, List<Suspect> suspects) {
    double[] shape = notes.frets().get(fret);
    double[] slope = notes.acrossTheBoard(shape);
    Pair pair = Pair.of(neck, neck.trace(shape), neck.trace(slope));
    boolean turnsOver = Math.abs(pair.second().value()) > Math.abs(pair.first().value());
    double significant = SIGNIFICANT_SLANT;
    if (turnsOver && stands(pair.second(), significant)) {
      double enough = significant * significant + ONE_MORE;
      Suspect.Effect effect = Suspect.Shapes.of(shape, slope);
      suspects.add(suspect(fret, true, pair.second(), pair.gain(), enough, effect));
    }
  }

  private static boolean stands(Amount amount, double significant) {
    return Math.abs(amount.value()) >= OFF && amount.significance() >= significant;
  }

  private static Suspect suspect(
      int fret, boolean slanted, Amount amount, double gain, double enough, Suspect.Effect effect) {
    return new Suspect(
        Kind.FRET, Suspect.NONE, fret, slanted, amount.value(), amount.sd(), gain, enough, effect);
  }
}
