package sillet.desktop.controls;

import java.time.Instant;
import sillet.logbook.text.Message;

/** The square in the top line that says what stands on the disk. Call on the window's thread. */
public interface SaveSign {
  /** On the disk. */
  void saved(Instant at);

  /** Typed, not yet part of the record. */
  void draft(Instant since);

  /** Not on the disk; says why and what to do. */
  void notSaved(Message why);
}
