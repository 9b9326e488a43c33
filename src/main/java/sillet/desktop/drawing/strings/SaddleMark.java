package sillet.desktop.drawing.strings;

import org.jspecify.annotations.Nullable;

/**
 * Where one string's saddle stands and where it should go. All places in mm, growing away from the
 * neck: from the nominal scale line for single saddles, from the front edge for a one-piece saddle.
 *
 * @param nowMm where it stands
 * @param targetMm best place; null where nothing is to do. Beyond the travel it is drawn at the
 *     bracket, with the rest of the arrow broken
 * @param lowMm lower end of the 95 % interval of the best place; null where not known
 * @param highMm upper end; null where not known
 * @param beforeMm where it stood in the pass before; null where it has not moved
 * @param travelNeckMm end of the travel toward the neck; null where not known
 * @param travelAwayMm end of the travel away from the neck; null where not known
 */
public record SaddleMark(
    double nowMm,
    @Nullable Double targetMm,
    @Nullable Double lowMm,
    @Nullable Double highMm,
    @Nullable Double beforeMm,
    @Nullable Double travelNeckMm,
    @Nullable Double travelAwayMm) {
  /** A saddle with nothing to do. */
  public static SaddleMark at(double nowMm) {
    return new SaddleMark(nowMm, null, null, null, null, null, null);
  }

  /** The same between its travel ends. */
  public SaddleMark within(double neckMm, double awayMm) {
    return new SaddleMark(nowMm, targetMm, lowMm, highMm, beforeMm, neckMm, awayMm);
  }

  /** The same with a best place and its interval. */
  public SaddleMark to(double bestMm, double low, double high) {
    return new SaddleMark(nowMm, bestMm, low, high, beforeMm, travelNeckMm, travelAwayMm);
  }

  /** The same with an interval that holds the present place: leave it. */
  public SaddleMark leave(double low, double high) {
    return new SaddleMark(nowMm, null, low, high, beforeMm, travelNeckMm, travelAwayMm);
  }

  /** The same with the place it came from. */
  public SaddleMark from(double oldMm) {
    return new SaddleMark(nowMm, targetMm, lowMm, highMm, oldMm, travelNeckMm, travelAwayMm);
  }

  /** The best place as far as the travel reaches; null where nothing is to do. */
  public @Nullable Double reachableMm() {
    if (targetMm == null) {
      return null;
    }
    double reachable = targetMm;
    if (travelNeckMm != null) {
      reachable = Math.max(reachable, travelNeckMm);
    }
    return travelAwayMm == null ? Double.valueOf(reachable) : Math.min(reachable, travelAwayMm);
  }
}
