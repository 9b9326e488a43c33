package sillet.acoustics.estimate;

import java.util.Arrays;
import java.util.BitSet;
import org.jspecify.annotations.Nullable;

/** How far each fret lies from where the scale puts it, in m, positive toward the bridge. */
public final class FretPlaces {
  /** Every fret where it should be. */
  public static final FretPlaces TRUE = new FretPlaces(new double[0], null);

  private final double[] byFret;
  private final @Nullable BitSet asked;

  private FretPlaces(double[] byFret, @Nullable BitSet asked) {
    this.byFret = byFret;
    this.asked = asked;
  }

  /**
   * Places by fret.
   *
   * @param byFret index is the fret, index 0 of no meaning; frets beyond its end lie true; finite
   * @throws IllegalArgumentException if a place is not finite
   */
  public static FretPlaces of(double... byFret) {
    for (double place : byFret) {
      if (!Double.isFinite(place)) {
        throw new IllegalArgumentException("a fret lies at " + place);
      }
    }
    return new FretPlaces(byFret.clone(), null);
  }

  /** Metres toward the bridge; 0 for a fret nothing is known of. */
  public double at(int fret) {
    if (asked != null && fret >= 1) {
      asked.set(fret);
    }
    return fret >= 1 && fret < byFret.length ? byFret[fret] : 0;
  }

  /** The same frets, one of them elsewhere. */
  FretPlaces with(int fret, double place) {
    double[] changed = Arrays.copyOf(byFret, Math.max(byFret.length, fret + 1));
    changed[fret] = place;
    return new FretPlaces(changed, null);
  }

  /** The same frets, telling which of them a figure asks for. */
  FretPlaces watched(BitSet frets) {
    return new FretPlaces(byFret, frets);
  }
}
