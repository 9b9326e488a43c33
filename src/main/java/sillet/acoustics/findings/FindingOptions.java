package sillet.acoustics.findings;

import java.util.Map;
import java.util.Set;

/**
 * What the estimate does not know.
 *
 * @param targetActions the shop's target for the clearance over fret 12 in m, by index of the
 *     string; strings without one get no finding of action
 * @param disagreements notes of the last pass whose tries disagree
 */
public record FindingOptions(Map<Integer, Double> targetActions, Set<Note> disagreements) {
  /** No target, no disagreement. */
  public static final FindingOptions NONE = new FindingOptions(Map.of(), Set.of());

  /** Copies. */
  public FindingOptions {
    targetActions = Map.copyOf(targetActions);
    disagreements = Set.copyOf(disagreements);
  }

  /**
   * A note.
   *
   * @param string index of the string, 0 first
   * @param fret from 1
   */
  public record Note(int string, int fret) {}
}
