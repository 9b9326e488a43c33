package sillet.acoustics.pickups;

import sillet.acoustics.pitch.Cents;

/**
 * How a magnet under the string lowers its pitch, to first order.
 *
 * <p>df / f = -(k L / (pi^2 T)) sin^2(pi x / L), k the field's stiffness at the string in N/m, x
 * the distance from the bridge: Rayleigh's quotient of the fundamental with a weak negative spring
 * [D]. k depends on magnet, string and gap and has no published value, so only shares can be told
 * without measuring: the figure here is for k that somebody measured.
 */
public final class MagnetPull {

  private MagnetPull() {}

  /**
   * How much of the pull at the middle of the string is left here: sin^2(pi x / L).
   *
   * @param place of the pickup
   * @param fret where the string is pressed, 0 for open, on the neck side of the pickup
   * @return 0 to 1
   */
  public static double share(PickupPlace place, int fret) {
    double sine = place.response(1, fret);
    return sine * sine;
  }

  /**
   * Cents by which the pull shifts the open string; below zero, flat.
   *
   * @param place of the pickup
   * @param stiffness of the field in N/m, not negative and weak: the result below some 20 cents
   * @param tension of the string in N, above zero
   */
  public static double cents(PickupPlace place, double stiffness, double tension) {
    if (!(stiffness >= 0) || !(tension > 0) || Double.isInfinite(stiffness + tension)) {
      throw new IllegalArgumentException("no pull of " + stiffness + " at " + tension);
    }
    double slowed = stiffness * place.scale() / (Math.PI * Math.PI * tension) * share(place, 0);
    return Cents.ofSmallShare(-slowed);
  }
}
