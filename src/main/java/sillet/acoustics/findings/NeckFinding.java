package sillet.acoustics.findings;

import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import sillet.acoustics.findings.Evidence.Measure;

/**
 * A cause of errors that no saddle cures.
 *
 * @param kind what it is
 * @param string index of the string, 0 first; empty = all strings
 * @param fret that is out of place or was read wrongly; empty = none
 * @param slanted whether a fret's error turns its sign over across the board
 * @param amount m: a slot's height above its neighbours, how far the nut stands too far from (or,
 *     as a positive figure too, too near) fret 1, a fret's place toward the bridge (slanted: under
 *     the first string), action above target. Cents: a reading's distance from what the others say,
 *     the root mean square of a string's errors
 * @param amountSd its standard deviation, same unit
 * @param worthCents by how much the root mean square over frets 1 to 12 would fall if it were cured
 *     and the saddle then set anew; for a cause of all strings their mean
 * @param evidence numbers that speak for it
 */
public record NeckFinding(
    Kind kind,
    OptionalInt string,
    OptionalInt fret,
    boolean slanted,
    double amount,
    double amountSd,
    double worthCents,
    List<Evidence> evidence) {

  /** Copies the evidence. */
  public NeckFinding {
    evidence = List.copyOf(evidence);
  }

  /** The first number of a measure. */
  public OptionalDouble evidence(Measure measure) {
    return evidence.stream()
        .filter(one -> one.measure() == measure)
        .mapToDouble(Evidence::value)
        .findFirst();
  }
}
