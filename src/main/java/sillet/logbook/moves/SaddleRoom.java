package sillet.logbook.moves;

import org.jspecify.annotations.Nullable;
import sillet.logbook.instruments.SaddleKind;

/**
 * What the bridge lets a saddle do; what is not known is null.
 *
 * @param screwMm way per turn of the screw, millimetres
 * @param backMm travel left away from the neck, millimetres
 * @param forwardMm travel left toward the neck, millimetres
 * @param kind how the strings end at the bridge; null if not known
 * @param thicknessMm of a one-piece saddle, millimetres
 * @param nut whether the nut can move
 */
public record SaddleRoom(
    @Nullable Double screwMm,
    @Nullable Double backMm,
    @Nullable Double forwardMm,
    @Nullable SaddleKind kind,
    @Nullable Double thicknessMm,
    NutMovable nut) {
  /** Nothing known, a nut that stays. */
  public static final SaddleRoom NOT_KNOWN =
      new SaddleRoom(null, null, null, null, null, NutMovable.NO);

  /**
   * Tells whether the edges of a fixed saddle end the travel.
   *
   * @return true for a fixed saddle, false also where the kind is not known
   */
  public boolean onePiece() {
    return kind == SaddleKind.ONE_PIECE;
  }

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
