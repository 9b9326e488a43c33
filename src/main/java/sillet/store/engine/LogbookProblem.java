package sillet.store.engine;

import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/**
 * The one failure of the store: what kind, at which place, and what lies behind it. Whoever shows
 * it says {@link #reason()}; the cause is for those who look after the program.
 */
public final class LogbookProblem extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final ProblemKind kind;
  private final String place;

  /**
   * Names a problem.
   *
   * @param kind what stands in the way
   * @param place where the logbook lies, as text
   * @param cause what lies behind it, null if nothing does
   */
  public LogbookProblem(ProblemKind kind, String place, @Nullable Throwable cause) {
    super(kind + " at " + place, cause);
    this.kind = kind;
    this.place = place;
  }

  public ProblemKind kind() {
    return kind;
  }

  public String place() {
    return place;
  }

  /**
   * The sentence to show.
   *
   * @return the key of the kind, with the place as its value
   */
  public Message reason() {
    return Message.of(kind.key(), place);
  }
}
