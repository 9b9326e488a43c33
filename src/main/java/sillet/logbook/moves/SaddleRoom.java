package sillet.logbook.moves;

import org.jspecify.annotations.Nullable;

/**
 * What the bridge lets a saddle do; what is not known is null.
 *
 * @param screwMm way per turn of the screw, millimetres
 * @param backMm travel left away from the neck, millimetres
 * @param forwardMm travel left toward the neck, millimetres
 * @param onePiece true for a fixed saddle, whose edges end the travel
 * @param nut whether the nut can move
 */
public record SaddleRoom(
    @Nullable Double screwMm,
    @Nullable Double backMm,
    @Nullable Double forwardMm,
    boolean onePiece,
    NutMovable nut) {
  /** Nothing known, a nut that stays. */
  public static final SaddleRoom NOT_KNOWN = new SaddleRoom(null, null, null, false, NutMovable.NO);

  /**
   * Travel left in the way a move goes.
   *
   * @param moveMm positive away from the neck
   * @return millimetres, or null if not known
   */
  public @Nullable Double toward(double moveMm) {
    return moveMm >= 0 ? backMm : forwardMm;
  }
}
