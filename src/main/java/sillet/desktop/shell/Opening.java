package sillet.desktop.shell;

import sillet.store.engine.LogbookProblem;

/** What came of opening a logbook. */
sealed interface Opening {
  /** It is open. */
  record Opened(OpenLogbook open) implements Opening {}

  /** There is none yet. */
  record Nothing() implements Opening {}

  /** It is there, or should be, and cannot be opened. */
  record Refused(LogbookProblem problem) implements Opening {}
}
