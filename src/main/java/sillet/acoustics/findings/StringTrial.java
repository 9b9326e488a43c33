package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.findings.LinearNeck.Trace;

/**
 * A false string, in two ways: errors like those of a mass that swings along the string in waves of
 * any length ({@link RippleShapes}), which go up and down over the frets without being mere chance;
 * or errors of no shape at all that are far wider than the readings'.
 */
final class StringTrial implements CauseTrial {
  /** Gain from which a swing is believed: the best of eleven waves, each with two amounts. */
  private static final double SWING_ENOUGH = 15.5;

  /** What must be left of it without the string's worst note, as a share. */
  private static final double WITHOUT_WORST = 0.5;

  /** Swings below these, as shares of the mass, are no fault; strings within makers' scatter. */
  private static final double LEAST_SWING = 0.009;

  private static final double MOST_SWING = 0.08;

  /** Gain of a wider spread that is believed, twice the logarithm of a likelihood ratio. */
  private static final double SPREAD_ENOUGH = 25;

  /** Where the top resounds single notes stray far by themselves. */
  private static final double RESOUNDING = 1.7;

  private static final double LEAST_TIMES = 1.5;

  /** A reading trusted so many times less is left out. */
  private static final double LEFT_OUT = 100;

  private static final double FEWEST_FREE = 3;
  private static final int FEWEST_FRETS = 5;

  @Override
  public List<Suspect> look(NeckCase notes, LinearNeck neck) {
    List<Suspect> suspects = new ArrayList<>();
    for (int string = 0; string < notes.strings(); string++) {
      Residuals spread = Residuals.of(notes, neck, string);
      if (notes.fretsOf(string) < FEWEST_FRETS || spread.free() < FEWEST_FREE) {
        continue;
      }
      double restless = notes.resounds() ? RESOUNDING : 1;
      double beyond =
          Math.max(
              swingBeyond(notes, neck, string, SWING_ENOUGH * restless),
              spread.gain() - SPREAD_ENOUGH * restless);
      if (beyond > 0) {
        double times = Math.max(LEAST_TIMES, Math.sqrt(spread.ratio()));
        suspects.add(
            new Suspect(
                Kind.STRING,
                string,
                Suspect.NONE,
                false,
                times,
                0,
                beyond + SWING_ENOUGH,
                SWING_ENOUGH,
                new Suspect.Doubt(notes.rowsOf(string), times)));
      }
    }
    return suspects;
  }

  /** How far a swing's gain goes beyond enough; it must not hang on one note. */
  private static double swingBeyond(NeckCase notes, LinearNeck neck, int string, double enough) {
    double gain = swingGain(notes, neck, string);
    if (gain < enough) {
      return gain - enough;
    }
    boolean[] worst = new boolean[neck.rows()];
    worst[worstOf(notes, neck, string)] = true;
    LinearNeck without = new Suspect.Doubt(worst, LEFT_OUT).in(neck);
    return swingGain(notes, without, string) < WITHOUT_WORST * enough ? -enough : gain - enough;
  }

  private static int worstOf(NeckCase notes, LinearNeck neck, int string) {
    boolean[] own = notes.rowsOf(string);
    int worst = -1;
    double most = -1;
    for (int row = 0; row < own.length; row++) {
      if (own[row] && neck.alone(row).significance() > most) {
        most = neck.alone(row).significance();
        worst = row;
      }
    }
    return worst;
  }

  /** Best gain of a swing of believable size; 0 for none. */
  static double swingGain(NeckCase notes, LinearNeck neck, int string) {
    double best = 0;
    for (int wave = 0; wave < RippleShapes.count(); wave++) {
      Pair pair = swing(notes, neck, string, wave);
      best = believable(pair) ? Math.max(best, pair.gain()) : best;
    }
    return best;
  }

  /** Size of the best swing, as a share of the mass; 0 for none that is believable. */
  static double swing(NeckCase notes, LinearNeck neck, int string) {
    double best = 0;
    double size = 0;
    for (int wave = 0; wave < RippleShapes.count(); wave++) {
      Pair pair = swing(notes, neck, string, wave);
      if (believable(pair) && pair.gain() > Math.max(best, SWING_ENOUGH)) {
        best = pair.gain();
        size = size(pair);
      }
    }
    return size;
  }

  private static boolean believable(Pair pair) {
    return size(pair) >= LEAST_SWING && size(pair) <= MOST_SWING;
  }

  private static double size(Pair pair) {
    return Math.hypot(pair.first().value(), pair.second().value());
  }

  private static Pair swing(NeckCase notes, LinearNeck neck, int string, int wave) {
    Trace sine = neck.trace(notes.ripple(string, wave, false));
    Trace cosine = neck.trace(notes.ripple(string, wave, true));
    return Pair.of(neck, sine, cosine);
  }
}
