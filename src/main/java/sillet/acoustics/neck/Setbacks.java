package sillet.acoustics.neck;

import java.util.List;

/**
 * Where saddle and nut stand, from their places in the nominal scale.
 *
 * @param saddle + away from the neck, in m
 * @param nut + away from the bridge, in m
 */
public record Setbacks(double saddle, double nut) {

  /** Both at their nominal places. */
  public static final Setbacks NONE = new Setbacks(0, 0);

  /**
   * One straight saddle and nut for several strings: the mean of what each wants, which to first
   * order is the least-squares answer.
   *
   * @throws IllegalArgumentException for an empty list
   */
  public static Setbacks mean(List<Setbacks> strings) {
    if (strings.isEmpty()) {
      throw new IllegalArgumentException("no strings to share a saddle");
    }
    double saddle = 0;
    double nut = 0;
    for (Setbacks string : strings) {
      saddle += string.saddle;
      nut += string.nut;
    }
    return new Setbacks(saddle / strings.size(), nut / strings.size());
  }
}
