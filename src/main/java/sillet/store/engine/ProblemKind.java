package sillet.store.engine;

/** What can stand between a technician and the logbook; each has a sentence of its own. */
public enum ProblemKind {
  /** Somebody else has it open. */
  IN_USE("problem.in-use"),
  /** It cannot be read, or not all of it is there. */
  DAMAGED("problem.damaged"),
  /** A newer version of the program wrote it. */
  NEWER("problem.newer"),
  /** The place may be read but not written. */
  READ_ONLY("problem.read-only"),
  /** There is no logbook at the place. */
  NO_SUCH("problem.no-such"),
  /** There is something at the place already, so nothing can be created there. */
  EXISTS("problem.exists"),
  /** The disk is full or does not obey. */
  DISK("problem.disk"),
  /** The text cannot be the place of a logbook. */
  BAD_PLACE("problem.bad-place"),
  /** Somebody else changed the same thing meanwhile, or entered it first. Nothing was saved. */
  CONFLICT("problem.conflict"),
  /** The action concerns something this logbook does not hold. Nothing was saved. */
  NOT_THERE("problem.not-there"),
  /** A text is longer than the logbook can keep. Nothing was saved, and nothing was cut. */
  TOO_LONG("problem.too-long"),
  /** The action may be in the logbook or not: it was not seen to reach the disk. */
  NOT_CERTAIN("problem.not-certain"),
  /** The logbook is closed, or closed itself after trouble, and has to be opened again. */
  CLOSED("problem.closed"),
  /** A row of recorded actions cannot be read by this program. */
  UNREADABLE_ACTION("problem.unreadable-action"),
  /** Anything else. */
  UNEXPECTED("problem.unexpected");

  private final String key;

  ProblemKind(String key) {
    this.key = key;
  }

  /**
   * The text key of its sentence.
   *
   * @return key of the text bundle, with one place for where the logbook lies
   */
  public String key() {
    return key;
  }
}
