package sillet.acoustics.pickups;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.pitch.FretPositions;

/**
 * A pickup under a string.
 *
 * <p>Harmonic k of a string of length L moves as sin(k pi x / L); its nodes lie where k x / L is a
 * whole number, and a pickup there does not hear it [D from the ideal string, textbook].
 *
 * @param scale nominal scale in m: the open string
 * @param fromBridge from the saddle to the middle of the pickup in m
 */
public record PickupPlace(double scale, double fromBridge) {

  /**
   * How near to a whole number k x / L has to be: within 0.1 the harmonic comes at 0.31 of its
   * loudest at most, 10 dB down. Our own limit, no source.
   */
  public static final double UNHEARD_WITHIN = 0.1;

  /**
   * Refuses, as the caller's bug, what cannot be: the pickup lies between nut and saddle.
   *
   * @throws IllegalArgumentException unless 0 is below {@code fromBridge} and that below {@code
   *     scale}
   */
  public PickupPlace {
    if (!(fromBridge > 0) || !(scale > fromBridge) || Double.isInfinite(scale)) {
      throw new IllegalArgumentException("no pickup at " + fromBridge + " of " + scale);
    }
  }

  /** The same pickup seen from another distance. */
  public PickupPlace at(double otherFromBridge) {
    return new PickupPlace(scale, otherFromBridge);
  }

  /**
   * Distance from the bridge as a share of the string.
   *
   * @param fret where it is pressed, 0 for the open string, at most {@link FretPositions#HIGHEST}
   * @return above 0; 1 and more where the fret lies over the pickup or beyond it
   */
  public double share(int fret) {
    FretPositions.requireFret(fret);
    return fromBridge / scale * EqualTemperament.ratio(fret);
  }

  /**
   * How loud a harmonic is here against the loudest place of the string.
   *
   * @param harmonic 1 for the fundamental
   * @param fret 0 for the open string
   * @return 0 at a node, 1 at an antinode
   */
  public double response(int harmonic, int fret) {
    requireHarmonic(harmonic);
    return Math.abs(Math.sin(harmonic * Math.PI * share(fret)));
  }

  /**
   * The harmonics that are hardly heard here.
   *
   * @param fret where the string is pressed, 0 for open
   * @param highest the highest harmonic looked at, at least 1
   * @return in order; empty where none is, or where the fret lies over the pickup
   */
  public List<Integer> unheard(int fret, int highest) {
    requireHarmonic(highest);
    double share = share(fret);
    List<Integer> unheard = new ArrayList<>();
    for (int harmonic = 1; share < 1 && harmonic <= highest; harmonic++) {
      double place = harmonic * share;
      if (place > 0.5 && Math.abs(place - Math.rint(place)) <= UNHEARD_WITHIN) {
        unheard.add(harmonic);
      }
    }
    return unheard;
  }

  private static void requireHarmonic(int harmonic) {
    if (harmonic < 1) {
      throw new IllegalArgumentException("no such harmonic: " + harmonic);
    }
  }
}
