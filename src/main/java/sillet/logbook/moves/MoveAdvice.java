package sillet.logbook.moves;

import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/**
 * What Sillet says of one string.
 *
 * @param string what it was reckoned from
 * @param figures the figures; null if they could not be solved, the notes say why
 * @param verdict what to do with them
 * @param findings causes only; empty for a clean string
 * @param notes sentences for people, the most important first
 */
public record MoveAdvice(
    BenchString string,
    @Nullable MoveFigures figures,
    Verdict verdict,
    Set<Finding> findings,
    List<Message> notes) {

  /** Copies the lists. */
  public MoveAdvice {
    findings = Set.copyOf(findings);
    notes = List.copyOf(notes);
  }
}
