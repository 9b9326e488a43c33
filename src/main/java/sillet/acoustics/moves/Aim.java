package sillet.acoustics.moves;

import java.util.Collections;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What a move is to make true.
 *
 * <p>Fret 12 against its own reference, or the weighted sum of squared cents over some frets
 * against the open string as small as it can be.
 */
public final class Aim {
  /** Fret 12 agrees with its reference. */
  public static final Aim OCTAVE = new Aim(new TreeMap<>(Map.of(OctaveNote.FRET, 1.0)));

  /** Frets 1 to 12 alike. */
  public static final Aim NECK = new Aim(alike(12));

  private static final int LAST_FRET = 24;

  private final SortedMap<Integer, Double> weights;

  private Aim(SortedMap<Integer, Double> weights) {
    this.weights = weights;
  }

  /**
   * Frets of one's own.
   *
   * @param weights by fret, 1 to 24; each above zero and finite; at least one
   * @throws IllegalArgumentException if a fret or a weight is out of range or there is none
   */
  public static Aim frets(Map<Integer, Double> weights) {
    if (weights.isEmpty()) {
      throw new IllegalArgumentException("an aim without a fret");
    }
    weights.forEach(
        (fret, weight) -> {
          if (fret < 1 || fret > LAST_FRET || !(weight > 0) || Double.isInfinite(weight)) {
            throw new IllegalArgumentException("fret " + fret + " with weight " + weight);
          }
        });
    return new Aim(new TreeMap<>(weights));
  }

  /** Weight by fret. */
  public SortedMap<Integer, Double> weights() {
    return Collections.unmodifiableSortedMap(weights);
  }

  private static SortedMap<Integer, Double> alike(int frets) {
    SortedMap<Integer, Double> weights = new TreeMap<>();
    for (int fret = 1; fret <= frets; fret++) {
      weights.put(fret, 1.0);
    }
    return weights;
  }
}
