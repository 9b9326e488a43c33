package sillet.desktop.drawing.strings;

/**
 * How the instrument lies before the technician.
 *
 * @param bridgeLeft the bridge lies to the left
 * @param stringOneBelow string 1 lies at the bottom
 */
public record Lie(boolean bridgeLeft, boolean stringOneBelow) {
  /** Nut left, bridge right, string 1 at the top. */
  public static final Lie USUAL = new Lie(false, false);

  /** A left-handed instrument is mirrored; turning it puts head and foot about. */
  public static Lie of(boolean leftHanded, boolean turned) {
    return new Lie(leftHanded != turned, turned);
  }

  /** 1 where "away from the neck" points right, else -1. */
  public int away() {
    return bridgeLeft ? -1 : 1;
  }
}
