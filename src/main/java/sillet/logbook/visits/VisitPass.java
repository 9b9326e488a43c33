package sillet.logbook.visits;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.BridgeAdvice;
import sillet.logbook.moves.FindingReport;

/**
 * One round over a whole instrument.
 *
 * @param strings each string in this pass, string 1 first
 * @param findings causes that a saddle cannot cure, in the order in which to look
 * @param bridge what a saddle or bridge in one piece can do for all strings together; null where
 *     every string has a saddle of its own or nothing was read
 */
public record VisitPass(
    List<StringPass> strings, List<FindingReport> findings, @Nullable BridgeAdvice bridge) {

  /** Copies the lists. */
  public VisitPass {
    strings = List.copyOf(strings);
    findings = List.copyOf(findings);
  }
}
