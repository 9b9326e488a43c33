package sillet.desktop.bench;

/** How far one string of an open visit is, by its newest reading at fret 12. */
enum StringState {
  /** Nothing read yet. */
  UNREAD,
  /** Moved since it was read. */
  READ_AGAIN,
  /** More than a cent off. */
  OFF,
  /** Within a cent. */
  NEAR
}
