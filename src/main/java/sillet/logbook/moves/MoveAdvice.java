package sillet.logbook.moves;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/**
 * What Sillet says of one string.
 *
 * @param string what it was reckoned from
 * @param figures the figures; null if they could not be solved, the notes say why
 * @param verdict what to do with them
 * @param neck its notes by fret, now and after the move, in the order of the frets; empty without
 *     figures
 * @param findings causes that concern this string, in the order in which to look; empty for a clean
 *     string
 * @param notes sentences for people, the most important first
 */
public record MoveAdvice(
    BenchString string,
    @Nullable MoveFigures figures,
    Verdict verdict,
    List<FretCents> neck,
    List<FindingReport> findings,
    List<Message> notes) {

  /** Copies the lists. */
  public MoveAdvice {
    neck = List.copyOf(neck);
    findings = List.copyOf(findings);
    notes = List.copyOf(notes);
  }
}
