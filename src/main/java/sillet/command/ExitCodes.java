package sillet.command;

/** What the program answers to the shell it was started from. */
final class ExitCodes {
  static final int DONE = 0;
  static final int ANYTHING_ELSE = 1;

  /** Bad usage, or an input that is missing, a folder, unreadable or wrong. */
  static final int BAD_INPUT = 2;

  /** The logbook is in use or cannot be reached. */
  static final int LOGBOOK_BUSY = 3;

  /** The logbook is damaged, or newer than the program. */
  static final int LOGBOOK_UNFIT = 4;

  static final int TROUBLE_WRITING = 5;

  private ExitCodes() {}
}
