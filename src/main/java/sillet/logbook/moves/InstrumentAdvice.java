package sillet.logbook.moves;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What Sillet says of an instrument.
 *
 * @param strings an advice for each string, in the order they were handed in
 * @param findings causes that a saddle cannot cure, in the order in which to look; empty for a
 *     clean instrument
 * @param bridge what a saddle or bridge in one piece can do for all strings together; null where
 *     every string has a saddle of its own
 */
public record InstrumentAdvice(
    List<MoveAdvice> strings, List<FindingReport> findings, @Nullable BridgeAdvice bridge) {

  /** Copies the lists. */
  public InstrumentAdvice {
    strings = List.copyOf(strings);
    findings = List.copyOf(findings);
  }
}
