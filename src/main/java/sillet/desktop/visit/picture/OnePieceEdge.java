package sillet.desktop.visit.picture;

/** What is never filed away at the edges of a one-piece saddle. */
public final class OnePieceEdge {
  /** Bone left standing at each edge, millimetres; a shop figure (common practice, no source). */
  public static final double KEPT_MM = 0.4;

  private OnePieceEdge() {}
}
